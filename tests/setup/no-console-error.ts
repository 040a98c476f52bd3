import { afterEach, beforeEach, expect, vi, type MockInstance } from 'vitest';

/** Any console.error that a test does not claim (`vi.mocked(console.error).mockClear()`) fails it. */
let spy: MockInstance<typeof console.error>;

beforeEach(() => {
  spy = vi.spyOn(console, 'error');
});

afterEach(() => {
  const calls = spy.mock.calls.map((call) => call.map(String).join(' '));
  expect(calls, 'unexpected console.error').toEqual([]);
});
