import { addDays, type CalendarDay } from '@/lib/calendar';
import { type KnownWall } from './films';
import { type CareHome } from './types';
import { type Turn } from './yearly-turns';

/** A wall of which nothing is known is looked at within this many days of setting up the home. Our rule. */
const firstLookDays = 30;
/** A regular walkaround that begins this soon after setting up would ask for the same look again. Our rule. */
const tooSoonDays = 60;

function unknownFilms(home: CareHome, { wall, coat, seal }: KnownWall): { coat: boolean; seal: boolean } {
  const hasOwn = (kind: 'restain' | 'recaulk') => home.ownRules.some((rule) => rule.wallId === wall.id && rule.kind === kind);
  return { coat: coat.startedOn === null && !hasOwn('restain'), seal: seal.startedOn === null && !hasOwn('recaulk') };
}

/** True when the day of the coat or of the caulk is not known, and no rule of the owner's stands in for it. */
export function isUnknown(home: CareHome, known: KnownWall): boolean {
  const unknown = unknownFilms(home, known);
  return unknown.coat || unknown.seal;
}

export function unknownWords(home: CareHome, known: KnownWall): string {
  const { coat, seal } = unknownFilms(home, known);
  if (coat && seal) return 'Nobody knows when this wall was last stained or caulked, so walk around it first. Logging those days, or a restain and a recaulk, settles it.';
  return coat
    ? 'Nobody knows when this wall was last stained, so walk around it first. Logging that day, or a restain, settles it.'
    : 'Nobody knows when this wall was last caulked, so walk around it first. Logging that day, or a recaulk, settles it.';
}

/** The walkarounds of a wall whose dates are not known: one at once, then the regular ones that are not too soon after it. */
export function firstLook(since: CalendarDay, regular: Turn[]): Turn[] {
  const closesOn = addDays(since, firstLookDays);
  const look: Turn = { dueOn: closesOn, window: { opensOn: since, closesOn, moved: 'in season' } };
  return [look, ...regular.filter((turn) => turn.window.opensOn > addDays(since, tooSoonDays))];
}
