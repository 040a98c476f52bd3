import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { jointRuleOf } from '@/lib/home/wall-joints';
import { type WallSizes } from '@/lib/takeoff';
import { jointsOfWalls } from '@/lib/takeoff/joints';
import { exampleSealants, type SealantAnswer, sealantAnswer, usualJoint } from '@/lib/takeoff/sealant-need';

/** Caulk and backer rod for some walls of a home, as a crew counts it: joints of 1/4 in, boards of 16 ft, a tenth of waste. Our rule. */
export function caulkForHome(home: { sidingNominalIn: number }, walls: readonly WallSizes[], units: UnitSystem): SealantAnswer | null {
  if (walls.length === 0) return null;
  const rule = jointRuleOf(home.sidingNominalIn);
  return sealantAnswer({ joints: jointsOfWalls(walls, rule), widthM: usualJoint.widthM, wasteShare: usualJoint.wasteShare, sizes: exampleSealants, units, rule });
}
