import { squareMetresPerSquareFoot } from '@/lib/units';

export type WallSizes = { widthM: number; heightM: number; gableHeightM?: number | undefined; openings?: { widthM: number; heightM: number; count?: number | undefined }[] | undefined };

const positive = (value: number, what: string) => {
  if (!Number.isFinite(value) || value < 0) throw new RangeError(`${what} must be a number of 0 or more`);
  return value;
};

/**
 * Flat area of a wall: width × height + width × gable height / 2 − doors and windows. m in, m² out, never below 0.
 * @throws RangeError for a negative or missing size
 */
export function wallAreaM2(wall: WallSizes): number {
  const width = positive(wall.widthM, 'width');
  const gross = width * positive(wall.heightM, 'height') + (width * positive(wall.gableHeightM ?? 0, 'gable height')) / 2;
  const holes = (wall.openings ?? []).reduce((sum, one) => sum + positive(one.widthM, 'width') * positive(one.heightM, 'height') * positive(one.count ?? 1, 'count'), 0);
  return Math.max(0, gross - holes);
}

const metre = Math.sqrt(squareMetresPerSquareFoot);

/**
 * As `wallAreaM2` in ft and ft².
 * @example wallAreaFt2({ widthFt: 30, heightFt: 9, openings: [{ widthFt: 3, heightFt: 4, count: 3 }] }) // 234
 */
export function wallAreaFt2(wall: { widthFt: number; heightFt: number; gableHeightFt?: number | undefined; openings?: { widthFt: number; heightFt: number; count?: number | undefined }[] | undefined }): number {
  const m2 = wallAreaM2({
    widthM: wall.widthFt * metre,
    heightM: wall.heightFt * metre,
    gableHeightM: (wall.gableHeightFt ?? 0) * metre,
    openings: (wall.openings ?? []).map(({ widthFt, heightFt, count }) => ({ widthM: widthFt * metre, heightM: heightFt * metre, count })),
  });
  return m2 / squareMetresPerSquareFoot;
}
