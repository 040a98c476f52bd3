import { addDays, type CalendarDay } from '@/lib/calendar';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { type WorkItem } from './types';

type Stage = 'book' | 'buy' | 'open' | 'overdue';

/** A stage that has begun: which, its step where it comes more than once, and the day it began. */
export type ReachedStage = { stage: Stage; step?: number; onDay: CalendarDay };

type StageRow = { stage: Stage; step?: number; from: 'opensOn' | 'closesOn'; days: number; kinds: WorkKind[] };

const films: WorkKind[] = ['restain', 'recaulk'];
const all: WorkKind[] = [...films, 'wash', 'walkaround'];

/** When an owner is reminded, in order: days before (−) or after the window's opening or closing. Our rule. */
const stages: StageRow[] = [
  { stage: 'book', from: 'opensOn', days: -120, kinds: films },
  { stage: 'buy', from: 'opensOn', days: -28, kinds: films },
  { stage: 'open', from: 'opensOn', days: 0, kinds: all },
  { stage: 'overdue', step: 1, from: 'closesOn', days: 14, kinds: all },
  { stage: 'overdue', step: 2, from: 'closesOn', days: 45, kinds: films },
  { stage: 'overdue', step: 3, from: 'closesOn', days: 105, kinds: films },
];
/** So long after the window has closed, nobody is reminded any more. Our rule. */
const silentAfterDays = 400;

type Staged = Pick<WorkItem, 'kind' | 'window'>;

const stagesOf = ({ kind, window }: Staged): ReachedStage[] =>
  stages
    .filter(({ kinds }) => kinds.includes(kind))
    .map(({ stage, step, from, days }) => ({ stage, ...(step ? { step } : {}), onDay: addDays(window[from], days) }));

/** The stage that an item is in on a day: the latest that has begun, until the next begins. Null before the first and long after the last. */
export function stageOn(item: Staged, today: CalendarDay): ReachedStage | null {
  if (today > addDays(item.window.closesOn, silentAfterDays)) return null;
  return stagesOf(item).findLast(({ onDay }) => onDay <= today) ?? null;
}

/** The day on which the next stage begins, after `today`; null when none is left. */
export const nextStageDay = (item: Staged, today: CalendarDay): CalendarDay | null => stagesOf(item).find(({ onDay }) => onDay > today)?.onDay ?? null;

/** One delivery: the same person is told of a stage of one piece of work once, whatever happens. */
export const deliveryKey = ({ wallId, kind, dueOn }: Pick<WorkItem, 'wallId' | 'kind' | 'dueOn'>, { stage, step }: Pick<ReachedStage, 'stage' | 'step'>, userId: string): string =>
  [wallId, kind, dueOn, step ? `${stage}-${step}` : stage, userId].join(':');
