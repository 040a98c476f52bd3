import { type Obstruction, type WallFace } from './wall-face';

const radians = Math.PI / 180;
/** Degrees clockwise off the wall's normal, −180 to 180. */
const off = (azimuthDeg: number, wallDeg: number) => ((((azimuthDeg - wallDeg + 180) % 360) + 360) % 360) - 180;
const span = (one: Obstruction) => (((one.toAzimuthDeg - one.fromAzimuthDeg) % 360) + 360) % 360 || 360;

/** Share of the wall's sky between the ground and an elevation (degrees), over any stretch of azimuth: (2e + sin 2e)/π, 1 at the zenith. */
const below = (elevationDeg: number) => {
  const e = Math.min(90, Math.max(0, elevationDeg)) * radians;
  return (2 * e + Math.sin(2 * e)) / Math.PI;
};

/** What is hidden of a slice of sky from the ground to the zenith; of obstructions behind each other the least transparent counts. */
function hiddenIn(slice: readonly Obstruction[], leafOn: boolean): number {
  const opacity = (one: Obstruction) => 1 - (leafOn ? one.transmittanceLeafOn : one.transmittanceLeafOff);
  const byHeight = [...slice].sort((a, b) => b.elevationDeg - a.elevationDeg);
  let darkest = 0;
  return byHeight.reduce((hidden, one, i) => {
    darkest = Math.max(darkest, opacity(one));
    return hidden + darkest * (below(one.elevationDeg) - below(byHeight[i + 1]?.elevationDeg ?? 0));
  }, 0);
}

/**
 * Share of an evenly bright sky that a vertical wall still sees over the obstructions of its horizon, relative to a flat horizon, 0–1.
 * Exact geometry: a stretch of sky counts by cos(incidence) = cos(e)·cos(a) over its solid angle cos(e)·de·da, a being the azimuth off the
 * normal. From the ground to e and from a₁ to a₂ that is (sin a₂ − sin a₁)/2 · (2e + sin 2e)/π of the wall's sky; what stands behind the
 * wall hides nothing. An obstruction hides its stretch times (1 − transmittance).
 * Our rules: one horizon stands for all heights of the wall, and with an eave its share and this one are multiplied.
 * @example an opaque horizon of 30° all around leaves 0.391
 */
export function skyOverHorizon(wall: WallFace, leafOn: boolean): number {
  const horizon = wall.horizon ?? [];
  if (horizon.length === 0) return 1;
  const ends = horizon.flatMap((one) => [off(one.fromAzimuthDeg, wall.azimuthDeg), off(one.fromAzimuthDeg + span(one), wall.azimuthDeg)]);
  const edges = [-90, ...ends.filter((edge) => edge > -90 && edge < 90).sort((a, b) => a - b), 90];
  let hidden = 0;
  for (let i = 0; i + 1 < edges.length; i += 1) {
    const [from, to] = [edges[i] as number, edges[i + 1] as number];
    const middle = wall.azimuthDeg + (from + to) / 2;
    const slice = horizon.filter((one) => off(middle, one.fromAzimuthDeg + 180) + 180 <= span(one));
    hidden += ((Math.sin(to * radians) - Math.sin(from * radians)) / 2) * hiddenIn(slice, leafOn);
  }
  return Math.min(1, Math.max(0, 1 - hidden));
}
