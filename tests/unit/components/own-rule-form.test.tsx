// @vitest-environment jsdom
import { act, cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { SWRConfig } from 'swr';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { OwnRuleForm } from '@/components/home/own-rule-form';
import { type OwnPreview } from '@/lib/care/own-preview';
import { type ActionState } from '@/lib/schemas/action-state';

type Asked = { address: string; body: Record<string, unknown> };
let asked: Asked[];
let answer: { status: number; json: unknown };

const preview = (values: Partial<Extract<OwnPreview, { ok: true }>> = {}): OwnPreview => ({
  ok: true, words: 'every 5 years, on June 15', countedFrom: '2026-12-01', days: [{ dueOn: '2031-06-15', opensOn: '2031-05-01', closesOn: '2031-08-14' }], missedOn: null, pastLife: null, ...values,
});
const start = { how: 'simple' as const, every: '5', unit: 'years' as const, months: ['6'], rule: 'FREQ=YEARLY;INTERVAL=5;BYMONTH=6;BYMONTHDAY=15', startOn: '2026-12-01' };

beforeEach(() => {
  vi.useFakeTimers();
  asked = [];
  answer = { status: 200, json: preview() };
  vi.stubGlobal('fetch', (address: string, { body }: { body: string }) => {
    asked.push({ address, body: JSON.parse(body) as Record<string, unknown> });
    return Promise.resolve(Response.json(answer.json, { status: answer.status }));
  });
  return () => {
    vi.unstubAllGlobals();
    vi.useRealTimers();
  };
});
afterEach(cleanup);

const show = (first: OwnPreview = preview(), action: (previous: ActionState, form: FormData) => Promise<ActionState> = () => Promise.resolve({ ok: true, message: null })) =>
  render(
    <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0 }}>
      <OwnRuleForm action={action} target={{ homeId: 'h1', wallId: 'w1', kind: 'restain' }} start={start} first={first} />
    </SWRConfig>,
  );
const days = () => screen.getByRole('region', { name: 'The days of this rule' });
const settle = () => act(() => vi.advanceTimersByTimeAsync(1000));
const type = (label: string, value: string) => fireEvent.input(screen.getByLabelText(label), { target: { value } });

describe('the form of an own rule', () => {
  it('shows the days that came with the page, and asks for nothing', async () => {
    show();
    await settle();
    expect(days().textContent).toContain('Every 5 years, on June 15. Counted from December 1, 2026.');
    expect(within(days()).getByRole('listitem').textContent).toBe('June 15, 2031 → done between May 1 and August 14, 2031');
    expect(asked).toEqual([]);
  });

  it('asks once for what was typed, a moment after the last keystroke', async () => {
    show();
    answer.json = preview({ words: 'every 12 years, on June 15', pastLife: { months: 90, lifeMonths: 54, stripCents: 35112 } });
    type('Every', '1');
    type('Every', '12');
    await settle();
    expect(asked).toEqual([{ address: '/api/homes/h1/rule-preview', body: { homeId: 'h1', wallId: 'w1', kind: 'restain', how: 'simple', every: '12', unit: 'years', months: ['6'], rule: start.rule, startOn: '2026-12-01' } }]);
    expect(days().textContent).toContain('about 7 years 6 months past the expected life of the coat (4 years 6 months)');
    expect(days().textContent).toContain('$351.12');
  });

  it('says why a rule is refused, by its days or by its text', async () => {
    show();
    answer.json = { ok: false, about: 'rule', error: 'This rule falls on no day in the next 100 years.' };
    type('The rule', 'FREQ=YEARLY;BYMONTH=1;BYYEARDAY=366');
    await settle();
    expect(days().textContent).toContain('no day in the next 100 years');
    answer = { status: 422, json: { errors: { rule: 'BYMONTH=13: whole numbers from 1 to 12 are allowed.' } } };
    type('The rule', 'FREQ=YEARLY;BYMONTH=13');
    await settle();
    expect(days().textContent).toContain('BYMONTH=13');
  });

  it('says so when there is no answer', async () => {
    show();
    answer = { status: 500, json: {} };
    type('Every', '4');
    await settle();
    expect(days().textContent).toContain('could not be worked out just now');
  });

  it('says that work would be overdue at once', () => {
    show(preview({ missedOn: '2026-08-14' }));
    expect(days().textContent).toContain('closed on August 14, 2026');
  });

  it('sends every answer, and keeps it when it is refused', async () => {
    const action = vi.fn((_: ActionState, form: FormData): Promise<ActionState> => Promise.resolve({ ok: false, message: 'Look.', errors: { every: 'Too long.' }, values: { every: String(form.get('every')) } }));
    const { container } = show(preview(), action);
    type('Every', '29');
    fireEvent.submit(container.querySelector('form')!);
    await settle();
    expect(action.mock.calls[0]?.[1].getAll('months[]')).toEqual(['6']);
    expect((screen.getByLabelText('Every') as HTMLInputElement).value).toBe('29');
    expect(container.textContent).toContain('Too long.');
  });
});
