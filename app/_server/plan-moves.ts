import 'server-only';
import { itemsOf } from '@/db/queries/home-view';
import { changeHome } from '@/db/queries/replan';
import { wallsOfHome } from '@/db/queries/walls';
import { planChange } from '@/lib/home/plan-change';
import { say } from './said';

/** Makes a change to a home, plans it anew, and tells what moved in the plan. The change itself checks who may make it. */
export function movePlan<T>(homeId: string, now: Date, change: () => T): { result: T; moves: string[] } {
  const before = itemsOf([homeId]);
  const result = changeHome(homeId, now, change);
  return { result, moves: planChange(before, itemsOf([homeId]), wallsOfHome(homeId).map(({ wall }) => wall)) };
}

/** Says on the next page what was done and what moved. */
export const sayMoves = (done: string, moves: readonly string[]): Promise<void> => say([done, ...(moves.length > 0 ? moves : ['Nothing in the plan moves.'])].join(' '));
