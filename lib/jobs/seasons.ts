import { workState } from '@/lib/care';
import { type WorkItem, type WorkState } from '@/lib/care/types';
import { type CalendarDay, dayIn, yearOf } from '@/lib/calendar';
import { type Texture } from '@/lib/schemas/vocabulary';
import { profileFactor, sidingProfile, wallAreaM2 } from '@/lib/takeoff';
import { exampleContainers, type StainEstimate } from '@/lib/takeoff/stain';
import { stainForWalls } from '@/lib/takeoff/stain-for-walls';
import { metresToInches } from '@/lib/units';

export type JobHome = { id: string; name: string; place: string; state: string; timeZone: string; sidingNominalIn: number; crownHeightM: number };
type JobWall = { id: string; name: string; position: number; azimuthDeg: number; widthM: number; heightM: number; gableHeightM: number; texture: Texture };

/** One piece of work on one wall, as the data layer finds it. */
export type Job = { home: JobHome; wall: JobWall; openings: { widthM: number; heightM: number; count: number }[]; item: WorkItem };

export type JobRow = { wallId: string; wallName: string; azimuthDeg: number; areaM2: number; texture: Texture; state: WorkState; item: WorkItem };

/** The work on one home in one year, walls in plan order. */
export type HomeJobs = { home: JobHome; today: CalendarDay; rows: JobRow[]; stainM2: number; stain: StainEstimate | null };

/** The work of one year's season; `opensOn` and `closesOn` span all its windows. */
export type SeasonJobs = { year: number; opensOn: CalendarDay; closesOn: CalendarDay; homes: HomeJobs[]; stainM2: number; buyL: number; overdue: number };

/** A crew counts two coats and a tenth of waste until the label or the owner says otherwise. Our rule. */
const crewHabit = { coats: 2, wasteShare: 0.1, sizes: exampleContainers };

/** True over flat area of a home's siding, 1 to π/2. */
export function homeProfileFactor(home: Pick<JobHome, 'sidingNominalIn' | 'crownHeightM'>): number {
  const face = sidingProfile(home.sidingNominalIn)?.exposedFaceIn;
  return face ? profileFactor(face, Math.min(metresToInches(home.crownHeightM), face / 2)) : 1;
}

const total = <T>(values: readonly T[], pick: (value: T) => number) => values.reduce((sum, value) => sum + pick(value), 0);

function grouped<T, K>(values: readonly T[], keyOf: (value: T) => K): Map<K, T[]> {
  const groups = new Map<K, T[]>();
  for (const value of values) groups.set(keyOf(value), [...(groups.get(keyOf(value)) ?? []), value]);
  return groups;
}

function homeJobs(jobs: readonly Job[], home: JobHome, now: Date): HomeJobs {
  const today = dayIn(home.timeZone, now);
  const rows = [...jobs]
    .sort((a, b) => a.wall.position - b.wall.position || (a.item.kind < b.item.kind ? -1 : 1))
    .map(({ wall, openings, item }) => ({ wallId: wall.id, wallName: wall.name, azimuthDeg: wall.azimuthDeg, texture: wall.texture, areaM2: wallAreaM2({ ...wall, openings }), state: workState(item, today), item }));
  const stained = rows.filter(({ item }) => item.kind === 'restain');
  return { home, today, rows, stainM2: total(stained, ({ areaM2 }) => areaM2), stain: stainForWalls(stained, { ...crewHabit, profileFactor: homeProfileFactor(home) }) };
}

const firstOpening = (jobs: readonly Job[]) => jobs.map(({ item }) => item.window.opensOn).sort()[0] ?? '';

/** Upcoming work by the year in which its window opens, homes by the day their first work opens. */
export function seasonsOf(jobs: readonly Job[], now: Date): SeasonJobs[] {
  return [...grouped(jobs, ({ item }) => yearOf(item.window.opensOn))]
    .sort(([a], [b]) => a - b)
    .map(([year, ofYear]) => {
      const byHome = [...grouped(ofYear, ({ home }) => home.id).values()].sort((a, b) => (firstOpening(a) < firstOpening(b) ? -1 : 1));
      const homes = byHome.flatMap((some) => (some[0] ? [homeJobs(some, some[0].home, now)] : []));
      return {
        year,
        opensOn: firstOpening(ofYear),
        closesOn: ofYear.map(({ item }) => item.window.closesOn).sort().at(-1) ?? '',
        homes,
        stainM2: total(homes, ({ stainM2 }) => stainM2),
        buyL: total(homes, ({ stain }) => stain?.buyL ?? 0),
        overdue: total(homes, ({ rows }) => rows.filter(({ state }) => state === 'overdue').length),
      };
    });
}
