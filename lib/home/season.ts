import { climateAt, coatingSeason, type CoatingSeason, stationById } from '@/lib/climate';
import { type StainBase } from '@/lib/schemas/vocabulary';

/** The coating seasons of a home for the stains that are on its walls; empty when its station is not in the table. */
export function seasonsOf(home: { stationId: string; elevationM: number | null }, bases: readonly StainBase[]): { station: string; seasons: { base: StainBase; season: CoatingSeason }[] } {
  const station = stationById(home.stationId);
  if (!station) return { station: '', seasons: [] };
  const climate = climateAt(station, home.elevationM);
  return { station: `${station.name}, ${station.state}`, seasons: [...new Set(bases)].map((base) => ({ base, season: coatingSeason(climate, base) })) };
}
