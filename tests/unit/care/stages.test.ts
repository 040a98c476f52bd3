import { describe, expect, it } from 'vitest';
import { addDays } from '@/lib/calendar';
import { deliveryKey, nextStageDay, stageOn } from '@/lib/care/stages';
import { type WorkItem } from '@/lib/care/types';

const item = (values: Partial<WorkItem> = {}): WorkItem => ({
  wallId: 'w1',
  kind: 'restain',
  rule: 'FREQ=MONTHLY;INTERVAL=48',
  startOn: '2023-06-10',
  dueOn: '2027-06-10',
  window: { opensOn: '2027-05-01', closesOn: '2027-08-09', moved: 'in season' },
  missedOn: null,
  lapsesOn: '2027-08-10',
  basis: 'computed',
  lifeMonths: 48,
  because: '',
  explanation: { figure: '', value: '', formula: '', inputs: [], sources: [] },
  ...values,
});
const stages = (of: WorkItem, days: string[]) => days.map((day) => stageOn(of, day)?.stage ?? null);

describe('reminder stages', () => {
  it('come 120 and 28 days before the window opens, and when it opens', () => {
    expect(stages(item(), ['2027-01-31', '2026-12-31', '2027-01-01', '2027-04-02', '2027-04-03', '2027-04-30', '2027-05-01', '2027-08-22'])).toEqual(['book', null, 'book', 'book', 'buy', 'buy', 'open', 'open']);
  });

  it('come 14, 45 and 105 days after the window closes, for wash and walkaround once', () => {
    const steps = (of: WorkItem) => [13, 14, 44, 45, 104, 105, 300].map((days) => stageOn(of, addDays('2027-08-09', days))?.step ?? 0);
    expect(steps(item())).toEqual([0, 1, 1, 2, 2, 3, 3]);
    expect(steps(item({ kind: 'wash' }))).toEqual([0, 1, 1, 1, 1, 1, 1]);
    expect(stages(item({ kind: 'walkaround' }), ['2027-04-30', '2027-05-01'])).toEqual([null, 'open']);
  });

  it('give one stage for work long overdue, and none after 400 days', () => {
    expect(stageOn(item(), addDays('2027-08-09', 400))).toEqual({ stage: 'overdue', step: 3, onDay: '2027-11-22' });
    expect(stageOn(item(), addDays('2027-08-09', 401))).toBeNull();
  });

  it('name the day of the next stage', () => {
    expect(nextStageDay(item(), '2026-06-01')).toBe('2027-01-01');
    expect(nextStageDay(item(), '2027-01-01')).toBe('2027-04-03');
    expect(nextStageDay(item(), '2027-08-23')).toBe('2027-09-23');
    expect(nextStageDay(item(), '2027-11-22')).toBeNull();
    expect(nextStageDay(item({ kind: 'wash' }), '2027-08-23')).toBeNull();
  });

  it('walk from stage to stage without leaving one out', () => {
    const seen: string[] = [];
    for (let day: string | null = nextStageDay(item(), '2020-01-01'); day; day = nextStageDay(item(), day)) {
      const reached = stageOn(item(), day);
      expect(reached?.onDay).toBe(day);
      seen.push(`${reached?.stage}${reached?.step ?? ''}`);
    }
    expect(seen).toEqual(['book', 'buy', 'open', 'overdue1', 'overdue2', 'overdue3']);
  });
});

describe('the key of a delivery', () => {
  it('differs by wall, kind, the film’s start, stage, step and person, and by nothing else: not by a date that moves', () => {
    const reached = { stage: 'overdue' as const, step: 1 };
    const key = deliveryKey(item(), reached, 'u1');
    expect(deliveryKey(item({ because: 'other words', lifeMonths: 50, dueOn: '2027-06-11' }), reached, 'u1')).toBe(key);
    const others = [
      deliveryKey(item({ wallId: 'w2' }), reached, 'u1'),
      deliveryKey(item({ kind: 'recaulk' }), reached, 'u1'),
      deliveryKey(item({ startOn: '2022-02-02' }), reached, 'u1'),
      deliveryKey(item(), { stage: 'overdue', step: 2 }, 'u1'),
      deliveryKey(item(), { stage: 'open' }, 'u1'),
      deliveryKey(item(), reached, 'u2'),
    ];
    expect(new Set([key, ...others]).size).toBe(7);
  });
});
