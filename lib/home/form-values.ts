import { type StoredCover } from '@/lib/home/cover';
import { lengthInput } from '@/lib/home/length-input';
import { type Cover, type UnitSystem } from '@/lib/schemas/vocabulary';
import { coverShares } from '@/lib/schemas/wall-cover';

type StoredWall = { widthM: number; heightM: number; gableHeightM: number; eaveDepthM: number; eaveDropM: number; azimuthDeg: number };
type StoredOpening = { kind: 'window' | 'door'; widthM: number; heightM: number; count: number };

/** Stored lengths as their forms show them. */
export function wallLengths(wall: StoredWall, units: UnitSystem) {
  const text = (metres: number) => lengthInput(metres, units);
  return { width: text(wall.widthM), height: text(wall.heightM), gableHeight: text(wall.gableHeightM), eaveDepth: text(wall.eaveDepthM), eaveDrop: text(wall.eaveDropM), azimuthDeg: Number(wall.azimuthDeg.toFixed(2)) };
}

export type CoverValues = { cover: Cover; coverDepth: string; coverHeight: string; coverShare: (typeof coverShares)[number] };

export const noCover: CoverValues = { cover: 'none', coverDepth: '', coverHeight: '', coverShare: '1' };

/** A stored porch roof or deck as its form shows it; a length that was never given is empty, a share the nearest that is offered. */
export function coverValues({ cover, coverDepthM, coverHeightM, coverShare }: StoredCover, units: UnitSystem): CoverValues {
  const text = (metres: number) => (metres > 0 ? lengthInput(metres, units) : '');
  const off = (share: string) => Math.abs(Number(share) - coverShare);
  return { cover, coverDepth: text(coverDepthM), coverHeight: text(coverHeightM), coverShare: coverShares.reduce((best, share) => (off(share) < off(best) ? share : best), '1') };
}

export const openingValues = (openings: readonly StoredOpening[], units: UnitSystem) =>
  openings.map(({ kind, widthM, heightM, count }) => ({ kind, width: lengthInput(widthM, units), height: lengthInput(heightM, units), count: String(count) }));

type StoredHome = {
  name: string;
  postalCode: string;
  latitude: number;
  longitude: number;
  elevationM: number | null;
  climateZoneOverride: string | null;
  sidingNominalIn: number;
  wood: string;
  yearBuilt: number | null;
};

export type HomeFormValues = {
  name: string;
  place: { postalCode: string; latitude: string; longitude: string; elevation: string; climateZoneOverride: string };
  siding: { sidingNominalIn: string; wood: string; yearBuilt: string };
};

/** Coordinates are shown only where they are not simply those of the postal code. */
export function homeValues(home: StoredHome, ofPostalCode: { latitude: number; longitude: number } | undefined, units: UnitSystem): HomeFormValues {
  const own = home.latitude !== ofPostalCode?.latitude || home.longitude !== ofPostalCode.longitude;
  return {
    name: home.name,
    place: {
      postalCode: home.postalCode,
      latitude: own ? String(home.latitude) : '',
      longitude: own ? String(home.longitude) : '',
      elevation: home.elevationM === null ? '' : lengthInput(home.elevationM, units, 1),
      climateZoneOverride: home.climateZoneOverride ?? '',
    },
    siding: { sidingNominalIn: String(home.sidingNominalIn), wood: home.wood, yearBuilt: home.yearBuilt === null ? '' : String(home.yearBuilt) },
  };
}
