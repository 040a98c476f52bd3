import { workState } from '@/lib/care';
import { type WorkItem, type WorkState } from '@/lib/care/types';
import { type CalendarDay } from '@/lib/calendar';
import { capital, wallWords } from '@/lib/home/wall-words';
import { type WorkKind } from '@/lib/schemas/vocabulary';

type Named = { id: string; name: string };

/** The same kind of work on several walls in the same window. */
export type WorkGroup = {
  kind: WorkKind;
  state: WorkState;
  opensOn: CalendarDay;
  closesOn: CalendarDay;
  /** The earliest day on which a window closed without this work. */
  missedOn: CalendarDay | null;
  walls: Named[];
  items: WorkItem[];
};

/** Most pressing first. */
export const urgency: Record<WorkState, number> = { overdue: 0, due: 1, 'due soon': 2, later: 3 };
/** Caulk goes before stain; the yearly rounds come last. */
const order: Record<WorkKind, number> = { recaulk: 0, restain: 1, wash: 2, walkaround: 3 };

/** What is to be done on a home, most pressing first. Walls keep their plan order inside a group. */
export function workGroups(items: readonly WorkItem[], walls: readonly Named[], today: CalendarDay): WorkGroup[] {
  const groups = new Map<string, WorkGroup>();
  for (const wall of walls) {
    for (const item of items.filter((one) => one.wallId === wall.id)) {
      const { opensOn, closesOn } = item.window;
      const state = workState(item, today);
      const key = [item.kind, state, opensOn, closesOn].join(' ');
      const group = groups.get(key) ?? { kind: item.kind, state, opensOn, closesOn, missedOn: item.missedOn, walls: [], items: [] };
      group.walls.push(wall);
      group.items.push(item);
      if (item.missedOn && item.missedOn < (group.missedOn ?? '9999')) group.missedOn = item.missedOn;
      groups.set(key, group);
    }
  }
  return [...groups.values()].sort((a, b) => urgency[a.state] - urgency[b.state] || (a.opensOn < b.opensOn ? -1 : a.opensOn > b.opensOn ? 1 : order[a.kind] - order[b.kind]));
}

/** The most pressing work of a home and what falls into the same window with it: what one trip does next. */
export function nextTogether(groups: readonly WorkGroup[]): WorkGroup[] {
  const [first] = groups;
  if (!first) return [];
  return groups.filter((group) => group.opensOn === first.opensOn && group.closesOn === first.closesOn && group.state === first.state);
}

/** 'Recaulk and restain Front and Back, wash Left side'. */
export function workWords(groups: readonly WorkGroup[], wallCount: number): string {
  const byWalls = new Map<string, { kinds: WorkKind[]; walls: Named[] }>();
  for (const { kind, walls } of groups) {
    const key = walls.map(({ id }) => id).join(' ');
    byWalls.set(key, { walls, kinds: [...(byWalls.get(key)?.kinds ?? []), kind] });
  }
  return capital([...byWalls.values()].map(({ kinds, walls }) => `${kinds.join(' and ')} ${wallWords(walls, wallCount)}`).join(', '));
}

/** The item that presses most: a coat before caulk, then the earliest day on which its film is used up. */
export function decidingItem(groups: readonly WorkGroup[]): WorkItem | undefined {
  const group = groups.find(({ kind }) => kind === 'restain') ?? groups[0];
  return group?.items.toSorted((a, b) => (a.dueOn < b.dueOn ? -1 : 1))[0];
}

/** The earliest missed day of some work, for one sentence about all of it. */
export const missedSince = (groups: readonly WorkGroup[]): CalendarDay | null => groups.flatMap(({ missedOn }) => missedOn ?? []).sort()[0] ?? null;
