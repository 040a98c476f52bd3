import { coverOf, eaveOf, skyShare, sunlitShare, type WallFace } from './wall-face';

/** An overhang over a strip of wall, m: `drop` is how far its underside is above the strip's top, `height` the strip's own. */
export type Overhang = { depth: number; drop: number; height: number };

/** A part of the wall's area, 0–1, with what overhangs it. */
export type Strip = { share: number; under: readonly [Overhang, ...Overhang[]] };

/**
 * A wall cut into strips that are each evenly overhung; their shares add up to 1.
 *
 * Without a cover it is one strip under the eave. With a cover (a porch roof, or a deck above) of depth d and height c over a share s of
 * the width of a wall of height h, and an eave of drop g: beside the cover 1 − s of the width, as before; below the cover's underside
 * the strip of height b = min(c, h), under the cover and, g + h − b above it, the eave; above it the rest, h − b, under the eave.
 * A cover above the wall's top leaves c − h above its strip.
 * Our rules: a cover is opaque, level, thin and endlessly long, so that no light comes in under its ends and it throws no shade beside
 * itself; light from the ground is as without it; its top reflects nothing; a gable counts as the wall below it.
 * Cutting a wall that has only an eave changes neither its sun nor its sky: the formulas add up.
 * @example h 2.4 m, cover 2.4 m deep over half of the width at 2.0 m: 0.5 beside it, 0.417 under it, 0.083 above it
 */
export function stripsOf(wall: WallFace): Strip[] {
  const eave = eaveOf(wall);
  const cover = coverOf(wall);
  if (!cover) return [{ share: 1, under: [eave] }];
  const below = Math.min(cover.heightM, eave.height);
  const above = eave.height - below;
  const strips: Strip[] = [
    { share: 1 - cover.share, under: [eave] },
    {
      share: (cover.share * below) / eave.height,
      under: [
        { depth: cover.depthM, drop: cover.heightM - below, height: below },
        { depth: eave.depth, drop: eave.drop + above, height: below },
      ],
    },
    { share: (cover.share * above) / eave.height, under: [{ ...eave, height: above }] },
  ];
  return strips.filter(({ share }) => share > 0);
}

/** The least of what each overhang leaves (our rule: the deeper shade holds, shades do not multiply), weighted by area. */
function weighted(strips: readonly Strip[], left: (overhang: Overhang) => number): number {
  let sum = 0;
  for (const { share, under } of strips) sum += share * under.reduce((least, overhang) => Math.min(least, left(overhang)), Infinity);
  return sum;
}

/** Share of the wall's area that direct sun reaches, 0–1, as a function of tan p = tan(elevation)/cos(azimuth difference), p the profile angle. */
export function litShareOf(strips: readonly Strip[]): (tanProfile: number) => number {
  const [only] = strips;
  if (strips.length === 1 && only?.under.length === 1) return (tanProfile) => sunlitShare(only.under[0], tanProfile);
  return (tanProfile) => weighted(strips, (overhang) => sunlitShare(overhang, tanProfile));
}

/** Average view of the sky from the wall, relative to one without overhangs, 0–1. */
export const skyShareOf = (strips: readonly Strip[]): number => weighted(strips, skyShare);
