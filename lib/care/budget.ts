import { type CalendarDay, dayOf, daysBetween, yearOf } from '@/lib/calendar';
import { filmJobs, type FilmKind } from './film-jobs';
import { type Grouping } from './grouping';
import { expandRule } from './rule-expand';
import { type CareHome, type WallPlan } from './types';
import { type Trip, type TripItem, yearsAhead } from './years-ahead';

export type BudgetYear = {
  year: number;
  tripCents: number;
  restainCents: number;
  stripCents: number;
  recaulkCents: number;
  washCents: number;
  /** Of all of these. */
  cents: number;
  trips: Trip[];
  /** Walls that are washed and not restained in this year. */
  washed: string[];
};

export type Budget = {
  years: BudgetYear[];
  cents: number;
  /** Total ÷ years from today to the end. */
  yearlyCents: number;
  from: CalendarDay;
  through: CalendarDay;
  /** Film work that is not counted because nobody knows the day to count from, or the owner's rule has ended. */
  missing: { wallId: string; kind: FilmKind }[];
};

const daysInYear = 365.25;
const sum = (amounts: readonly number[]) => amounts.reduce((total, one) => total + one, 0);

/** The years in which a wall's wash falls, by the plan's own rule for it. */
function washYears({ items }: WallPlan, through: CalendarDay): Set<number> {
  const wash = items.find(({ kind }) => kind === 'wash');
  if (!wash) return new Set();
  const later = wash.rule && wash.startOn ? expandRule(wash.rule, wash.startOn, wash.dueOn, through) : [];
  return new Set([wash.dueOn, ...later].map(yearOf));
}

type Washes = { wallId: string; cents: number; years: Set<number> }[];

function budgetYear(year: number, trips: Trip[], washes: Washes, tripCents: number): BudgetYear {
  const items = trips.flatMap((trip) => trip.items);
  const of = (kind: FilmKind, cents: (item: TripItem) => number) => sum(items.filter((item) => item.kind === kind).map(cents));
  const restained = new Set(items.filter(({ kind }) => kind === 'restain').map(({ wallId }) => wallId));
  const washed = washes.filter(({ wallId, years }) => years.has(year) && !restained.has(wallId));
  const parts = {
    tripCents: trips.length * tripCents,
    restainCents: of('restain', ({ cents }) => cents),
    stripCents: of('restain', ({ stripCents }) => stripCents),
    recaulkCents: of('recaulk', ({ cents }) => cents),
    washCents: sum(washed.map(({ cents }) => cents)),
  };
  return { year, ...parts, cents: sum(Object.values(parts)), trips, washed: washed.map(({ wallId }) => wallId) };
}

/**
 * What a home's walls cost by calendar year, this year (what is left of it) first: trips, restain, stripping, recaulk, and the wash
 * of every wall that is not restained in its year. In the home's own prices, without any rise of prices. Our rule.
 */
export function budget(home: CareHome, walls: readonly WallPlan[], grouping: Pick<Grouping, 'months'>, today: CalendarDay, years = 15): Budget {
  const { tripCents, washCentsPerM2 } = home.costs;
  const first = yearOf(today);
  const through = dayOf(first + years - 1, 12, 31);
  const jobs = filmJobs(home, walls);
  const { trips } = yearsAhead({ jobs, joinMonths: grouping.months, tripCents, notBefore: today, through });
  const washes = walls.map((plan) => ({
    wallId: plan.wallId,
    cents: Math.round((home.walls.find(({ id }) => id === plan.wallId)?.areaM2 ?? 0) * washCentsPerM2),
    years: washYears(plan, through),
  }));
  const byYear = Array.from({ length: years }, (_, i) => budgetYear(first + i, trips.filter(({ on }) => yearOf(on) === first + i), washes, tripCents));
  const cents = sum(byYear.map((one) => one.cents));
  const kinds: FilmKind[] = ['restain', 'recaulk'];
  const missing = walls.flatMap(({ wallId }) => kinds.filter((kind) => !jobs.some((job) => job.wallId === wallId && job.kind === kind)).map((kind) => ({ wallId, kind })));
  return { years: byYear, cents, yearlyCents: Math.round(cents / ((daysBetween(today, through) + 1) / daysInYear)), from: today, through, missing };
}
