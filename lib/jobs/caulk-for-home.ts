import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { asJointWall, jointRuleOf, type StoredWall } from '@/lib/home/wall-joints';
import { jointsOfWalls } from '@/lib/takeoff/joints';
import { exampleSealants, type SealantAnswer, sealantAnswer, usualJoint } from '@/lib/takeoff/sealant-need';

/** Caulk and backer rod for some walls of a home, as a crew counts it: the walls' own corners and pipes, joints of 1/4 in, boards of 16 ft, a tenth of waste. Our rule. */
export function caulkForHome(home: { sidingNominalIn: number }, walls: readonly StoredWall[], units: UnitSystem): SealantAnswer | null {
  if (walls.length === 0) return null;
  const rule = jointRuleOf(home.sidingNominalIn);
  return sealantAnswer({ joints: jointsOfWalls(walls.map(asJointWall), rule), widthM: usualJoint.widthM, wasteShare: usualJoint.wasteShare, sizes: exampleSealants, units, rule });
}
