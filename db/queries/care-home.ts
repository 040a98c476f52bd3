import { eq } from 'drizzle-orm';
import { type CalendarDay, dayIn } from '@/lib/calendar';
import { type CareHome } from '@/lib/care/types';
import { type Climate, climateAt, coatingSeason, stationById } from '@/lib/climate';
import { coverOfStored } from '@/lib/home/cover';
import { wallJointM } from '@/lib/home/wall-joints';
import { wallAreaM2 } from '@/lib/takeoff';
import { database } from '../client';
import { home } from '../schema';
import { costsOf } from './costs';
import { deferralsOf } from './deferrals';
import { refreshExposures } from './exposure';
import { findingsOf } from './findings';
import { type HomeRow } from './homes';
import { ownRulesOf } from './own-rules';
import { type WallDetail, wallsOfHome } from './walls';
import { recordsOfHome } from './work';

/**
 * A home as the care rules take it at `now`, with its row and the day there. Computes and stores the sun where its inputs changed.
 * Throws when the home or its station does not exist.
 */
export function careHomeAt(homeId: string, now: Date): { row: HomeRow; home: CareHome; today: CalendarDay } {
  const row = database().select().from(home).where(eq(home.id, homeId)).get();
  if (!row) throw new Error('the home to plan does not exist');
  const station = stationById(row.stationId);
  if (!station) throw new Error(`the climate station ${row.stationId} does not exist`);
  const climate = climateAt(station, row.elevationM);
  const walls = wallsOfHome(homeId);
  const doses = refreshExposures(row, climate, walls, now);
  return { row, home: careHomeOf(row, climate, walls, doses), today: dayIn(row.timeZone, now) };
}

/** A home as the care rules take it: what is stored of it, with its climate and the dose of each wall (kWh/m² a year, by wall). */
function careHomeOf(row: HomeRow, climate: Climate, walls: WallDetail[], doses: Map<string, number>): CareHome {
  const oil = coatingSeason(climate, 'oil');
  const waterborne = coatingSeason(climate, 'waterborne');
  return {
    id: row.id,
    latitude: row.latitude,
    scheffer: climate.scheffer,
    seasons: { oil: { seasons: oil.seasons, warning: oil.warning }, waterborne: { seasons: waterborne.seasons, warning: waterborne.warning } },
    since: dayIn(row.timeZone, row.createdAt),
    walls: walls.map(({ wall, openings }) => ({
      ...wall,
      cover: coverOfStored(wall),
      wood: row.wood,
      areaM2: wallAreaM2({ ...wall, openings }),
      jointM: wallJointM({ ...wall, openings }, row.sidingNominalIn),
      doseKwhM2: doses.get(wall.id) ?? 0,
    })),
    records: recordsOfHome(row.id).map((record) => ({
      id: record.id,
      kind: record.kind,
      doneOn: record.doneOn,
      wallIds: record.wallIds,
      finish: record.finish ?? undefined,
      stainBase: record.stainBase ?? undefined,
      sealant: record.sealant ?? undefined,
    })),
    findings: findingsOf(row.id),
    deferrals: deferralsOf(row.id),
    ownRules: ownRulesOf(row.id),
    costs: costsOf(row.id),
  };
}
