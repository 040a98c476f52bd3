/** A kind of opening in a wall; sizes in m. */
export type OpeningKind = { kind: 'window' | 'door'; widthM: number; heightM: number; count: number };

/** One opening on the front view: x from the wall's left end, y of its lower edge above the wall's foot, m. */
export type PlacedOpening = { kind: 'window' | 'door'; x: number; y: number; widthM: number; heightM: number };

const sill = 0.9;

/**
 * Where the openings are drawn on a wall, as only their sizes are known: doors in the middle, windows shared out to both sides,
 * equal gaps between. Windows sit 0.9 m up, lower when they would not fit under the wall's top. Where all of them are wider than
 * the wall, they are drawn narrower in proportion. Our rule, for drawing only.
 */
export function placeOpenings(wall: { widthM: number; heightM: number }, openings: readonly OpeningKind[]): PlacedOpening[] {
  const single = openings.flatMap((one) => Array.from({ length: one.count }, () => one));
  const windows = single.filter((one) => one.kind === 'window');
  const half = Math.ceil(windows.length / 2);
  const inOrder = [...windows.slice(0, half), ...single.filter((one) => one.kind === 'door'), ...windows.slice(half)];
  const total = inOrder.reduce((sum, one) => sum + one.widthM, 0);
  const shrink = Math.min(1, (wall.widthM * 0.95) / Math.max(total, 1e-9));
  const gap = (wall.widthM - total * shrink) / (inOrder.length + 1);
  let x = gap;
  return inOrder.map((one) => {
    const widthM = one.widthM * shrink;
    const heightM = Math.min(one.heightM, wall.heightM);
    const placed = { kind: one.kind, x, y: one.kind === 'door' ? 0 : Math.min(sill, Math.max(0, wall.heightM - heightM)), widthM, heightM };
    x += widthM + gap;
    return placed;
  });
}

/** Heights of the shadow lines between courses, m above the foot, up to the top of the gable. */
export function courseLines(heightM: number, exposedFaceM: number): number[] {
  const count = Math.ceil(heightM / exposedFaceM - 1e-9);
  return Array.from({ length: Math.max(0, count - 1) }, (_, i) => (i + 1) * exposedFaceM);
}
