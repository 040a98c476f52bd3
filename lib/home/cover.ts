import { type Cover, covers, type UnitSystem } from '@/lib/schemas/vocabulary';
import { type WallCover } from '@/lib/sun';
import { lengthText } from '@/lib/units';

/** The cover of a wall as it is stored: what was entered stays when there is none. Lengths in m. */
export type StoredCover = { cover: Cover; coverDepthM: number; coverHeightM: number; coverShare: number };

/** The porch roof or deck of a stored wall as the sun and the rain see it. */
export const coverOfStored = ({ cover, coverDepthM, coverHeightM, coverShare }: StoredCover): WallCover | undefined =>
  cover === 'none' ? undefined : { depthM: coverDepthM, heightM: coverHeightM, share: coverShare };

/** 'A porch roof, 8 ft deep, 8 ft up, over 50 % of the width'; null where there is none. */
export function coverWords(wall: StoredCover, units: UnitSystem): string | null {
  const cover = coverOfStored(wall);
  if (!cover) return null;
  return `${covers[wall.cover]}, ${lengthText(cover.depthM, units)} deep, ${lengthText(cover.heightM, units)} up, over ${Math.round(cover.share * 100)} % of the width`;
}
