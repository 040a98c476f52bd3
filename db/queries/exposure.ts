import { type Climate } from '@/lib/climate';
import { exposureInputs, exposureOf, pathOf, sunSite } from '@/lib/home/exposure';
import { database } from '../client';
import { wallExposure } from '../schema';
import { type HomeRow } from './homes';
import { type WallDetail } from './walls';

/** Computes the sun on each wall whose inputs changed and stores it; returns every wall's dose, kWh/m² a year. */
export function refreshExposures(home: HomeRow, climate: Climate, walls: WallDetail[], now: Date): Map<string, number> {
  const site = sunSite({ latitude: home.latitude, longitude: home.longitude }, climate);
  const doses = new Map<string, number>();
  let path: ReturnType<typeof pathOf> | undefined;
  for (const { wall, exposure } of walls) {
    const inputs = exposureInputs(wall, site, home.stationId);
    if (exposure?.inputs === inputs) {
      doses.set(wall.id, exposure.doseKwhM2);
      continue;
    }
    path ??= pathOf(site);
    const values = { ...exposureOf(wall, site, path), inputs, computedAt: now };
    database().insert(wallExposure).values({ wallId: wall.id, ...values }).onConflictDoUpdate({ target: wallExposure.wallId, set: values }).run();
    doses.set(wall.id, values.doseKwhM2);
  }
  return doses;
}
