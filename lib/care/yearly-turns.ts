import { addDays, type CalendarDay } from '@/lib/calendar';
import { readRule } from './rule-check';
import { walkRule } from './rule-days';
import { type Window } from './types';
import { monthWindow } from './window';

/** One date of yearly work with the month in which it is done. */
export type Turn = { dueOn: CalendarDay; window: Window };

/** Turns that lie ahead of a day, enough to find one that is still to be done and the one after it. */
const ahead = 6;
const longestLookDays = 366 * 40;

/** The turns of a rule whose month is not over on `since`: those begun by `today`, and the next few. One a month. */
export function turnsOf(rule: string, startOn: CalendarDay, since: CalendarDay, today: CalendarDay): Turn[] {
  const turns: Turn[] = [];
  const far = addDays(today > startOn ? today : startOn, longestLookDays);
  walkRule(readRule(rule), startOn, far, (dueOn) => {
    const window = monthWindow(dueOn);
    if (window.closesOn >= since && turns.at(-1)?.window.opensOn !== window.opensOn) turns.push({ dueOn, window });
    return turns.filter((turn) => turn.window.opensOn > today).length < ahead;
  });
  return turns;
}

/**
 * The turn to ask for on a day: the one that has begun, unless it is done, else the next that is not. It lapses when the
 * turn after it begins, so that yearly work nobody did is asked for once and not for every year that went by.
 */
export function turnToAsk(turns: Turn[], isDone: (turn: Turn, next: Turn | undefined) => boolean, today: CalendarDay): (Turn & { lapsesOn: CalendarDay | null }) | null {
  const begun = turns.findLastIndex((turn) => turn.window.opensOn <= today);
  const index = turns.findIndex((turn, i) => i >= begun && !isDone(turn, turns[i + 1]));
  const turn = turns[index];
  return turn ? { ...turn, lapsesOn: turns[index + 1]?.window.opensOn ?? null } : null;
}
