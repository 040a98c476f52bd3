import { visitsOf, workState } from '@/lib/care';
import { type WorkItem, type WorkState } from '@/lib/care/types';
import { type CalendarDay, dayIn, yearOf } from '@/lib/calendar';
import { caulkForHome } from '@/lib/jobs/caulk-for-home';
import { type Texture, type UnitSystem } from '@/lib/schemas/vocabulary';
import { profileFactor, sidingProfile, wallAreaM2 } from '@/lib/takeoff';
import { exampleContainers } from '@/lib/takeoff/stain';
import { type SealantAnswer } from '@/lib/takeoff/sealant-need';
import { type StainedWall, stainForWalls, type WallsEstimate } from '@/lib/takeoff/stain-for-walls';
import { metresToInches } from '@/lib/units';

export type JobHome = { id: string; name: string; place: string; state: string; timeZone: string; sidingNominalIn: number; crownHeightM: number };
type JobWall = { id: string; name: string; position: number; azimuthDeg: number; widthM: number; heightM: number; gableHeightM: number; corners: number; pipes: number; texture: Texture };

/** One piece of work on one wall, as the data layer finds it. */
export type Job = { home: JobHome; wall: JobWall; openings: { widthM: number; heightM: number; count: number }[]; item: WorkItem };

export type JobWork = WorkItem & { state: WorkState };

/** A wall in a visit, with its work in working order. */
export type JobRow = { wallId: string; wallName: string; azimuthDeg: number; areaM2: number; texture: Texture; works: JobWork[] };

/** One trip to one home: its walls in plan order, the days that suit all of it, and the stain and caulk that it takes. */
export type JobVisit = { home: JobHome; today: CalendarDay; opensOn: CalendarDay; closesOn: CalendarDay; rows: JobRow[]; stainM2: number; stain: WallsEstimate | null; caulk: SealantAnswer | null };

export type JobTotals = { homes: number; works: number; stainM2: number; buyL: number };

/** The visits of one year's season; `opensOn` and `closesOn` span them all. `withOverdue` counts overdue work of that season in. */
export type JobSeason = { year: number; opensOn: CalendarDay; closesOn: CalendarDay; visits: JobVisit[]; totals: JobTotals; withOverdue: JobTotals | null };

export type WorkAhead = { overdue: { visits: JobVisit[]; totals: JobTotals } | null; seasons: JobSeason[] };

/** A crew counts two coats and a tenth of waste until the label or the owner says otherwise. Our rule. */
const crewHabit = { coats: 2, wasteShare: 0.1, sizes: exampleContainers };

/** True over flat area of a home's siding, 1 to π/2. */
export function homeProfileFactor(home: Pick<JobHome, 'sidingNominalIn' | 'crownHeightM'>): number {
  const face = sidingProfile(home.sidingNominalIn)?.exposedFaceIn;
  return face ? profileFactor(face, Math.min(metresToInches(home.crownHeightM), face / 2)) : 1;
}

/** Stain for some walls of a home, as a crew counts it. */
export const stainForHome = (home: Pick<JobHome, 'sidingNominalIn' | 'crownHeightM'>, walls: readonly StainedWall[], units: UnitSystem): WallsEstimate | null =>
  stainForWalls(walls, { ...crewHabit, units, profileFactor: homeProfileFactor(home) });

const total = <T>(values: readonly T[], pick: (value: T) => number) => values.reduce((sum, value) => sum + pick(value), 0);

function grouped<T, K>(values: readonly T[], keyOf: (value: T) => K): T[][] {
  const groups = new Map<K, T[]>();
  for (const value of values) groups.set(keyOf(value), [...(groups.get(keyOf(value)) ?? []), value]);
  return [...groups.values()];
}

function rowOf(works: readonly JobWork[], { wall, openings }: Job): JobRow {
  return { wallId: wall.id, wallName: wall.name, azimuthDeg: wall.azimuthDeg, texture: wall.texture, areaM2: wallAreaM2({ ...wall, openings }), works: [...works] };
}

/** The trips to one home that some of its work needs. */
function visitsTo(jobs: readonly Job[], now: Date, units: UnitSystem): JobVisit[] {
  const inPlanOrder = [...jobs].sort((a, b) => a.wall.position - b.wall.position);
  const home = inPlanOrder[0]?.home;
  if (!home) return [];
  const today = dayIn(home.timeZone, now);
  return visitsOf(inPlanOrder.map(({ item }) => item)).map(({ opensOn, closesOn, items }) => {
    const works = items.map((item) => ({ ...item, state: workState(item, today) }));
    const rows = grouped(works, ({ wallId }) => wallId).flatMap((ofWall) => {
      const job = inPlanOrder.find(({ wall }) => wall.id === ofWall[0]?.wallId);
      return job ? [rowOf(ofWall, job)] : [];
    });
    const caulked = inPlanOrder.filter(({ item }) => item.kind === 'recaulk' && items.includes(item)).map(({ wall, openings }) => ({ ...wall, openings }));
    const stained = rows.filter((row) => row.works.some(({ kind }) => kind === 'restain'));
    return { home, today, opensOn, closesOn, rows, stainM2: total(stained, ({ areaM2 }) => areaM2), stain: stainForHome(home, stained, units), caulk: caulkForHome(home, caulked, units) };
  });
}

const visitsFor = (jobs: readonly Job[], now: Date, units: UnitSystem): JobVisit[] =>
  grouped(jobs, ({ home }) => home.id)
    .flatMap((ofHome) => visitsTo(ofHome, now, units))
    .sort((a, b) => (a.opensOn < b.opensOn ? -1 : a.opensOn > b.opensOn ? 1 : a.home.name < b.home.name ? -1 : 1));

const totalsOf = (visits: readonly JobVisit[]): JobTotals => ({
  homes: new Set(visits.map(({ home }) => home.id)).size,
  works: total(visits, ({ rows }) => total(rows, ({ works }) => works.length)),
  stainM2: total(visits, ({ stainM2 }) => stainM2),
  buyL: total(visits, ({ stain }) => stain?.buyL ?? 0),
});

/** Work of shared homes for a crew: what is overdue, then the rest by the year in which its window opens; in both home by home as visits. */
export function workAhead(jobs: readonly Job[], now: Date, units: UnitSystem): WorkAhead {
  const isOverdue = ({ home, item }: Job) => workState(item, dayIn(home.timeZone, now)) === 'overdue';
  const late = visitsFor(jobs.filter(isOverdue), now, units);
  const seasons = grouped(jobs.filter((job) => !isOverdue(job)), ({ item }) => yearOf(item.window.opensOn)).map((ofYear): JobSeason => {
    const visits = visitsFor(ofYear, now, units);
    const year = yearOf(ofYear[0]?.item.window.opensOn ?? '');
    const lateThen = late.filter(({ opensOn }) => yearOf(opensOn) === year);
    const days = ofYear.map(({ item }) => item.window);
    return {
      year,
      opensOn: days.map(({ opensOn }) => opensOn).sort()[0] ?? '',
      closesOn: days.map(({ closesOn }) => closesOn).sort().at(-1) ?? '',
      visits,
      totals: totalsOf(visits),
      withOverdue: lateThen.length > 0 ? totalsOf([...visits, ...lateThen]) : null,
    };
  });
  return { overdue: late.length > 0 ? { visits: late, totals: totalsOf(late) } : null, seasons: seasons.sort((a, b) => a.year - b.year) };
}
