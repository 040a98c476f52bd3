/**
 * A roof against a wall, lower than its eave or deeper: a porch roof, or a deck above. Its horizontal depth and the height of its underside
 * above the wall's foot, m; the share of the wall's width under it, 0–1.
 */
export type WallCover = { depthM: number; heightM: number; share: number };

/** A vertical wall: azimuth of its outward normal, degrees clockwise from true north; lengths in m. */
export type WallFace = {
  azimuthDeg: number;
  heightM?: number | undefined;
  /** Horizontal depth of the overhang and how far its underside is above the wall's top. */
  eaveDepthM?: number | undefined;
  eaveDropM?: number | undefined;
  cover?: WallCover | undefined;
  horizon?: Obstruction[] | undefined;
};

/** A stretch of horizon, clockwise from one azimuth to another, that stands higher than the ground. Transmittances 0 (opaque) to 1. */
export type Obstruction = {
  fromAzimuthDeg: number;
  toAzimuthDeg: number;
  elevationDeg: number;
  transmittanceLeafOn: number;
  transmittanceLeafOff: number;
};

const defaultHeightM = 2.44;

/** The eave of a wall as numbers; depth 0 when there is none. */
export const eaveOf = (wall: WallFace) => ({ depth: wall.eaveDepthM ?? 0, drop: wall.eaveDropM ?? 0, height: wall.heightM ?? defaultHeightM });

/** The cover of a wall where it covers anything, its share within 0–1. */
export function coverOf({ cover }: Pick<WallFace, 'cover'>): WallCover | undefined {
  if (!cover || !(cover.depthM > 0) || !(cover.heightM > 0) || !(cover.share > 0)) return undefined;
  return { ...cover, share: Math.min(1, cover.share) };
}

/**
 * Share of a wall's height that direct sun reaches under an infinite overhang, 0–1: f = clamp(1 − (d·tan p − g)/h),
 * profile angle tan p = tan(elevation)/cos(azimuth difference).
 */
export function sunlitShare(eave: { depth: number; drop: number; height: number }, tanProfile: number): number {
  if (eave.depth === 0) return 1;
  return Math.min(1, Math.max(0, 1 - (eave.depth * tanProfile - eave.drop) / eave.height));
}

/** Average view of the sky from a strip of that height under an infinite overhang, relative to none: (√((g+h)²+d²) − √(g²+d²))/h. */
export function skyShare({ depth, drop, height }: { depth: number; drop: number; height: number }): number {
  if (depth === 0) return 1;
  return (Math.hypot(drop + height, depth) - Math.hypot(drop, depth)) / height;
}

const turn = (degrees: number) => ((degrees % 360) + 360) % 360;

/** Share of direct light that passes what stands between the wall and the sun, 0–1. */
export function directShare(horizon: Obstruction[] | undefined, leafOn: boolean, azimuthDeg: number, elevationDeg: number): number {
  let share = 1;
  for (const one of horizon ?? []) {
    const span = turn(one.toAzimuthDeg - one.fromAzimuthDeg) || 360;
    const hidden = elevationDeg < one.elevationDeg && turn(azimuthDeg - one.fromAzimuthDeg) <= span;
    if (hidden) share = Math.min(share, leafOn ? one.transmittanceLeafOn : one.transmittanceLeafOff);
  }
  return share;
}
