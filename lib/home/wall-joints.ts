import { sidingProfile } from '@/lib/takeoff';
import { jointLengthM, jointsOfWall, type JointWall } from '@/lib/takeoff/joints';
import { usualJoint } from '@/lib/takeoff/sealant-need';
import { inchesToMetres } from '@/lib/units';

/** How the joints of a home are counted: the exposed face of its siding, boards of 16 ft (our rule). */
export const jointRuleOf = (sidingNominalIn: number) => ({
  exposedFaceM: inchesToMetres(sidingProfile(sidingNominalIn)?.exposedFaceIn ?? sidingNominalIn),
  boardM: usualJoint.boardM,
});

/** What is stored of a wall, with its openings; `corners` are log-end corners, `pipes` all that goes through it. */
export type StoredWall = Omit<JointWall, 'penetrations' | 'corners'> & { corners: number; pipes: number };

/** A stored wall as the joints see it: a foot of joint round each pipe (our rule). */
export const asJointWall = ({ pipes, ...wall }: StoredWall): JointWall => ({ ...wall, penetrations: { count: pipes, perimeterM: usualJoint.pipePerimeterM } });

/** Length of the joints of a wall that take caulk, m. */
export const wallJointM = (wall: StoredWall, sidingNominalIn: number): number => jointLengthM(jointsOfWall(asJointWall(wall), jointRuleOf(sidingNominalIn)));
