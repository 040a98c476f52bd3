import { addDays, type CalendarDay } from '@/lib/calendar';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { type WorkItem } from './types';
import { workKey } from './work-key';

type Stage = 'book' | 'buy' | 'open' | 'overdue';

/** A stage that has begun: which, its step where it comes more than once, and the day it began. */
export type ReachedStage = { stage: Stage; step?: number; onDay: CalendarDay };

type StageRow = { stage: Stage; step?: number; from: 'opening' | 'miss'; days: number; kinds: WorkKind[] };

const films: WorkKind[] = ['restain', 'recaulk'];
const all: WorkKind[] = [...films, 'wash', 'walkaround'];

/** When an owner is reminded: days before (−) or after the window's opening, or after a window closed without the work. Our rule. */
const stages: StageRow[] = [
  { stage: 'book', from: 'opening', days: -120, kinds: films },
  { stage: 'buy', from: 'opening', days: -28, kinds: films },
  { stage: 'open', from: 'opening', days: 0, kinds: all },
  { stage: 'overdue', step: 1, from: 'miss', days: 14, kinds: all },
  { stage: 'overdue', step: 2, from: 'miss', days: 45, kinds: films },
  { stage: 'overdue', step: 3, from: 'miss', days: 105, kinds: films },
];
/** So long after the miss, being overdue alone is no longer a reason to write. Our rule. */
const silentAfterDays = 400;

type Staged = Pick<WorkItem, 'kind' | 'window' | 'missedOn'>;

const missOf = ({ window, missedOn }: Staged) => missedOn ?? window.closesOn;

const stagesOf = (item: Staged): ReachedStage[] =>
  stages
    .filter(({ kinds }) => kinds.includes(item.kind))
    .map(({ stage, step, from, days }) => ({ stage, ...(step ? { step } : {}), onDay: addDays(from === 'opening' ? item.window.opensOn : missOf(item), days) }))
    .sort((a, b) => (a.onDay < b.onDay ? -1 : a.onDay > b.onDay ? 1 : 0));

/** The stage that an item is in on a day: the latest that has begun, until the next begins. Null before the first and long after the last. */
export function stageOn(item: Staged, today: CalendarDay): ReachedStage | null {
  const reached = stagesOf(item).findLast(({ onDay }) => onDay <= today) ?? null;
  return reached?.stage === 'overdue' && today > addDays(missOf(item), silentAfterDays) ? null : reached;
}

/** The day on which the next stage begins, after `today`; null when none is left. */
export const nextStageDay = (item: Staged, today: CalendarDay): CalendarDay | null => stagesOf(item).find(({ onDay }) => onDay > today)?.onDay ?? null;

type Identified = Pick<WorkItem, 'wallId' | 'kind' | 'startOn' | 'dueOn' | 'window'>;

/** One delivery: the same person is told of a stage of one piece of work once, whatever happens. The season of another month has its own stages. */
export function deliveryKey(item: Identified, { stage, step }: Pick<ReachedStage, 'stage' | 'step'>, userId: string): string {
  const which = stage === 'overdue' ? `${stage}-${step ?? 1}` : `${stage}-${item.window.opensOn.slice(0, 7)}`;
  return [workKey(item), which, userId].join(':');
}
