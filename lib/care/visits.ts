import { type Visit, type WorkItem } from './types';

/** The order in which work on a wall is done: look, wash, caulk, stain. */
export const workOrder = { walkaround: 0, wash: 1, recaulk: 2, restain: 3 } as const;

/**
 * Work of one home gathered into as few trips as its windows allow: what shares a day goes into one visit. The visit's days
 * are those that suit all of it. Walls keep the order in which they come in; on a wall, work is in working order.
 */
export function visitsOf(items: readonly WorkItem[]): Visit[] {
  const walls = [...new Set(items.map(({ wallId }) => wallId))];
  const inOrder = (a: WorkItem, b: WorkItem) => walls.indexOf(a.wallId) - walls.indexOf(b.wallId) || workOrder[a.kind] - workOrder[b.kind];
  const visits: Visit[] = [];
  for (const item of [...items].sort((a, b) => (a.window.closesOn < b.window.closesOn ? -1 : a.window.closesOn > b.window.closesOn ? 1 : inOrder(a, b)))) {
    const { opensOn, closesOn } = item.window;
    const visit = visits.find((one) => opensOn <= one.closesOn);
    if (!visit) visits.push({ opensOn, closesOn, items: [item] });
    else {
      visit.items.push(item);
      visit.opensOn = opensOn > visit.opensOn ? opensOn : visit.opensOn;
    }
  }
  for (const visit of visits) visit.items.sort(inOrder);
  return visits.sort((a, b) => (a.opensOn < b.opensOn ? -1 : 1));
}
