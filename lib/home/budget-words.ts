import { type CalendarDay, monthOf } from '@/lib/calendar';
import { monthNames } from '@/lib/calendar-words';
import { type Budget, type BudgetYear } from '@/lib/care/budget';
import { type FilmKind } from '@/lib/care/film-jobs';
import { type Trip } from '@/lib/care/years-ahead';
import { capital, wallWords } from '@/lib/home/wall-words';

type Named = { id: string; name: string };

const month = (day: CalendarDay) => monthNames[monthOf(day) - 1] ?? '';
const named = (ids: readonly string[], walls: readonly Named[]) => wallWords(walls.filter(({ id }) => ids.includes(id)), walls.length);

function tripWords({ on, items }: Trip, walls: readonly Named[]): string {
  const of = (kind: FilmKind, strip: boolean) => items.filter((item) => item.kind === kind && item.stripCents > 0 === strip).map(({ wallId }) => wallId);
  const parts = ([['strip and restain', of('restain', true)], ['restain', of('restain', false)], ['recaulk', of('recaulk', false)]] as const).filter(([, ids]) => ids.length > 0);
  return `${month(on)}: ${parts.map(([what, ids]) => `${what} ${named(ids, walls)}`).join('; ')}.`;
}

/** What is done in a year, a sentence a trip: 'June: restain Front and Back; recaulk Front.' 'Wash Left side.' */
export function yearWords({ trips, washed }: BudgetYear, walls: readonly Named[]): string[] {
  const wash = washed.length > 0 ? [`Wash ${named(washed, walls)}.`] : [];
  return [...trips.map((trip) => tripWords(trip, walls)), ...wash];
}

/** 'Not counted, because no day is known: the restain of Front; the recaulk of all 4 walls.' Null when all is counted. */
export function missingWords({ missing }: Budget, walls: readonly Named[]): string | null {
  const parts = (['restain', 'recaulk'] as const).flatMap((kind) => {
    const ids = missing.filter((one) => one.kind === kind).map(({ wallId }) => wallId);
    return ids.length > 0 ? [`the ${kind} of ${named(ids, walls)}`] : [];
  });
  return parts.length > 0 ? `Not counted, because there is no day to count from: ${parts.join('; ')}.` : null;
}

const within = (months: number) => (months === 0 ? 'Each wall waits for its own season' : `Walls due within ${months} months of a trip may share it`);

/** What a change did to the sharing of trips; null when nothing. */
export const sharingChange = (before: number | null, after: number | null): string | null =>
  before === after || after === null ? null : `${within(after)}.`;

/** 'Walls due within 12 months of a trip may share it. That saves about …' as a sentence of the page. */
export const sharingWords = (months: number): string => `${capital(within(months))}.`;
