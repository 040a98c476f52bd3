import { type CareHome } from '@/lib/care/types';
import { type Climate, coatingSeason } from '@/lib/climate';
import { dayIn } from '@/lib/calendar';
import { wallJointM } from '@/lib/home/wall-joints';
import { wallAreaM2 } from '@/lib/takeoff';
import { costsOf } from './costs';
import { deferralsOf } from './deferrals';
import { findingsOf } from './findings';
import { type HomeRow } from './homes';
import { ownRulesOf } from './own-rules';
import { type WallDetail } from './walls';
import { recordsOfHome } from './work';

/** A home as the care rules take it: what is stored of it, with its climate and the dose of each wall (kWh/m² a year, by wall). */
export function careHomeOf(row: HomeRow, climate: Climate, walls: WallDetail[], doses: Map<string, number>): CareHome {
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
