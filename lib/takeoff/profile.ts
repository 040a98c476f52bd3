/** Log cabin siding. Source: WWPA, Natural Wood Siding technical guide, table 4: nominal and dressed width and exposed face, in. */
export const sidingProfiles = [
  { nominalIn: 6, dressedIn: 5.4375, exposedFaceIn: 4.9375 },
  { nominalIn: 8, dressedIn: 7.125, exposedFaceIn: 6.625 },
  { nominalIn: 10, dressedIn: 9.125, exposedFaceIn: 8.625 },
] as const;

export const sidingProfile = (nominalIn: number) => sidingProfiles.find((profile) => profile.nominalIn === nominalIn);

/**
 * True area of a rounded face over its flat area: circle segment with chord c (exposed face) and crown h.
 * R = (c²/4 + h²)/(2h); factor = 2R·asin(c/2R)/c. Exact geometry. A flat face gives 1, a half-round π/2.
 * Computed as asin(x)/x with x = c/2R = c·h/(c²/4 + h²), which stays exact for the flattest of faces.
 * @param exposedFaceIn chord, in, > 0
 * @param crownHeightIn 0 to half the chord (any one unit will do for both)
 * @throws RangeError outside these ranges
 * @example profileFactor(6.625, 1) // 1.0597
 */
export function profileFactor(exposedFaceIn: number, crownHeightIn: number): number {
  if (!(exposedFaceIn > 0) || !(crownHeightIn >= 0) || crownHeightIn > exposedFaceIn / 2 + 1e-9) throw new RangeError('the crown must lie between 0 and half the exposed face');
  const x = Math.min(1, (exposedFaceIn * crownHeightIn) / (exposedFaceIn ** 2 / 4 + crownHeightIn ** 2));
  return x < 1e-9 ? 1 : Math.max(1, Math.asin(x) / x);
}

/** Courses on a wall: height over exposed face, rounded up. Same unit for both; a hair over a whole number is that number. */
export const courseCount = (height: number, exposedFace: number): number => Math.ceil(height / exposedFace - 1e-9);
