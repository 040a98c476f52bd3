import { describe, expect, it, vi } from 'vitest';
import { runSchedule } from '@/jobs/scheduler';

/** A day that passes in steps: each reading of the clock is half an hour later. */
function clock() {
  let at = Date.parse('2027-05-15T00:00:00Z') - 30 * 60_000;
  return () => new Date((at += 30 * 60_000));
}

describe('the scheduler', () => {
  it('reminds at the start and every hour, delivers in between, and stops when told', async () => {
    const stop = new AbortController();
    const turns: string[] = [];
    const note = (what: string) => () => {
      turns.push(what);
      if (turns.length === 6) stop.abort();
      return Promise.resolve();
    };
    await runSchedule({ now: clock(), remind: note('remind'), deliver: note('deliver'), everyMs: 1 }, stop.signal);
    expect(turns).toEqual(['remind', 'deliver', 'remind', 'deliver', 'remind', 'deliver']);
  });

  it('tells of a failure and goes on with the next turn', async () => {
    const said = vi.mocked(console.error).mockImplementation(() => undefined);
    const stop = new AbortController();
    let delivered = 0;
    const deliver = () => {
      delivered += 1;
      if (delivered === 3) stop.abort();
      return delivered === 1 ? Promise.reject(new Error('disk is full')) : Promise.resolve();
    };
    await runSchedule({ now: clock(), remind: () => Promise.reject(new Error('no such table')), deliver, everyMs: 1 }, stop.signal);
    expect(delivered).toBe(3);
    const lines = said.mock.calls.map(([line]) => JSON.parse(String(line)) as { job: string; message: string });
    expect(lines.filter(({ job }) => job === 'reminders').every(({ message }) => message === 'no such table')).toBe(true);
    expect(lines.filter(({ job }) => job === 'deliver').map(({ message }) => message)).toEqual(['disk is full']);
    said.mockClear();
  });
});
