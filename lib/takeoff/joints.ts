import { type Ground } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { type WallSizes } from './area';
import { courseCount } from './profile';

/** A wall as the joints see it. Lengths in m. */
export type JointWall = WallSizes & {
  /** Log-end corners that it shares with its neighbours, 0 to 2; two unless said. */
  corners?: number | undefined;
  /** Pipes, vents, lamps and sockets through the wall, each with its perimeter. */
  penetrations?: { count: number; perimeterM: number } | undefined;
};

export type JointRule = {
  /** Exposed face of a course, m, > 0. */
  exposedFaceM: number;
  /** Longest board on the wall, m, > 0. */
  boardM: number;
};

export type JointKind = 'openings' | 'corners' | 'butts' | 'penetrations';
export type Joint = { kind: JointKind; lengthM: number };

/** What each kind is called, how it is counted, and on whose word. The horizontal seams between courses are left open: they drain. */
export const jointKinds: Record<JointKind, { label: string; formula: string; ground: Ground; source: string }> = {
  openings: { label: 'Round windows and doors', formula: '2 × (width + height), each opening, added up', ground: 'common practice', source: 'Trim and window perimeters are caulked: common practice, no source' },
  corners: { label: 'Log-end corners', formula: 'two lines a corner × wall height, each corner shared by two walls', ground: 'common practice', source: 'Log ends and corners are caulked: common practice, no source; half a corner for each of its walls: our rule' },
  butts: { label: 'Butt joints', formula: 'courses × joints per course × exposed face; joints per course = boards end to end − 1', ground: ourRule('joints').ground, source: 'Butt joints are caulked: common practice, no source; how many there are: our rule' },
  penetrations: { label: 'Pipes and fittings', formula: 'count × perimeter', ground: 'common practice', source: 'Penetrations are caulked: common practice, no source' },
};

/** Boards end to end, less one; a hair over a whole number of boards is that number. */
const joinsIn = (widthM: number, boardM: number) => Math.max(0, Math.ceil(widthM / boardM - 1e-9) - 1);

/**
 * Joints of one wall that take caulk, by kind, m. Openings: 2 (w + h) each. Corners: two lines of the wall's height at each, of which
 * the wall counts half, so that four walls have four corners, not eight. Butt joints: courses × joints per course × exposed face;
 * openings are not taken off, and in a gable a course counts as half the wall's width (its mean): our rule.
 * @throws RangeError for a size below 0, or a face or board that is not above 0
 * @example 30 × 9 ft, three windows of 3 × 4 ft, 6.625 in face, boards of 16 ft: 42 + 18 + 17 × 6.625/12 = 69.4 ft
 */
export function jointsOfWall(wall: JointWall, { exposedFaceM, boardM }: JointRule): Joint[] {
  const { widthM, heightM, gableHeightM = 0, openings = [], corners = 2, penetrations = { count: 0, perimeterM: 0 } } = wall;
  const sizes = [widthM, heightM, gableHeightM, corners, penetrations.count, penetrations.perimeterM, ...openings.flatMap((one) => [one.widthM, one.heightM, one.count ?? 1])];
  if (!(exposedFaceM > 0) || !(boardM > 0) || !sizes.every((size) => size >= 0 && Number.isFinite(size))) throw new RangeError('sizes must be 0 or more, the face and the board above 0');
  const butts = courseCount(heightM, exposedFaceM) * joinsIn(widthM, boardM) + courseCount(gableHeightM, exposedFaceM) * joinsIn(widthM / 2, boardM);
  return [
    { kind: 'openings', lengthM: openings.reduce((sum, one) => sum + 2 * (one.widthM + one.heightM) * (one.count ?? 1), 0) },
    { kind: 'corners', lengthM: (corners / 2) * 2 * heightM },
    { kind: 'butts', lengthM: butts * exposedFaceM },
    { kind: 'penetrations', lengthM: penetrations.count * penetrations.perimeterM },
  ];
}

/** The joints of several walls, kind by kind. */
export function jointsOfWalls(walls: readonly JointWall[], rule: JointRule): Joint[] {
  const all = walls.flatMap((wall) => jointsOfWall(wall, rule));
  const kinds: JointKind[] = ['openings', 'corners', 'butts', 'penetrations'];
  return kinds.map((kind) => ({ kind, lengthM: all.reduce((sum, joint) => sum + (joint.kind === kind ? joint.lengthM : 0), 0) }));
}

/** All joints together, m. */
export const jointLengthM = (joints: readonly Joint[]): number => joints.reduce((sum, { lengthM }) => sum + lengthM, 0);
