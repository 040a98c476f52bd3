import { z } from 'zod';
import { between, list, wall, whole } from '@/lib/schemas/estimate';
import { keysOf, unitSystems } from '@/lib/schemas/vocabulary';
import { sidingProfile } from '@/lib/takeoff';
import { type Joint, type JointRule, jointsOfWalls } from '@/lib/takeoff/joints';
import { exampleSealants, fluidOuncesPerGallon, type SealantNeed, usualJoint } from '@/lib/takeoff/sealant-need';
import { feetToMetres, inchesToMetres } from '@/lib/units';

const container = z.object({
  floz: between(1, 64, 'Container size'),
  priceCents: whole(0, 10_000_000, 'The price should be a whole number of cents, 0 or more.'),
});

/** A wall may have its own log-end corners and pipes. */
const jointed = z.intersection(wall, z.object({ corners: whole(0, 2, 'Corners of a wall should be 0, 1 or 2.').optional(), pipes: whole(0, 1000, 'The count should be a whole number from 0 to 1000.').optional() }));

const penetrations = z.object({ count: whole(0, 1000, 'The count should be a whole number from 0 to 1000.'), perimeterIn: between(0, 240, 'Perimeter').default(12) }, { error: 'Penetrations should be a count and a perimeter.' });

/** Body of POST /api/estimates/sealant. Walls in ft, or the length of their joints in ft; the joint's width in inches. */
export const sealantSchema = z
  .object(
    {
      units: z.enum(keysOf(unitSystems), { error: 'Units should be us or metric.' }).default('us'),
      walls: list(jointed, 200, 'Walls', 1).optional(),
      lengthFt: between(0, 100_000, 'Length').optional(),
      jointWidthIn: between(0.25, 1, 'Joint width').default(0.25),
      nominalIn: z.literal([6, 8, 10], { error: 'The nominal width should be 6, 8 or 10.' }).default(8),
      boardFt: between(1, 60, 'Board length').default(16),
      corners: whole(0, 2, 'Corners of a wall should be 0, 1 or 2.').default(2),
      penetrations: penetrations.default({ count: 0, perimeterIn: 12 }),
      wastePercent: between(0, 50, 'Waste').default(usualJoint.wasteShare * 100),
      containers: list(container, 12, 'Containers', 1).optional(),
    },
    { error: 'The body should be a JSON object.' },
  )
  .transform((body, ctx): SealantNeed => {
    const { units, walls, lengthFt, jointWidthIn, wastePercent, containers } = body;
    if ((walls === undefined) === (lengthFt === undefined)) ctx.addIssue({ code: 'custom', path: ['walls'], message: 'Give either walls or lengthFt.' });
    const rule = { exposedFaceM: inchesToMetres(sidingProfile(body.nominalIn)?.exposedFaceIn ?? body.nominalIn), boardM: feetToMetres(body.boardFt) };
    const joints = walls ? jointsOf(walls, body, rule) : [{ kind: 'openings' as const, lengthM: feetToMetres(lengthFt ?? 0) }];
    const sizes = containers?.map(({ floz, priceCents }) => ({ gal: floz / fluidOuncesPerGallon, priceCents })) ?? exampleSealants;
    return { joints, widthM: inchesToMetres(jointWidthIn), wasteShare: wastePercent / 100, sizes, units, ...(walls ? { rule } : {}) };
  });

type Counted = { corners: number; penetrations: { count: number; perimeterIn: number } };

/** A wall's own corners win. Pipes of the body are those of all the walls together, on top of the walls' own; they are counted with the first. */
function jointsOf(walls: readonly z.output<typeof jointed>[], { corners, penetrations: { count, perimeterIn } }: Counted, rule: JointRule): Joint[] {
  const perimeterM = inchesToMetres(perimeterIn);
  return jointsOfWalls(walls.map(({ pipes = 0, ...one }, i) => ({ ...one, corners: one.corners ?? corners, penetrations: { count: pipes + (i === 0 ? count : 0), perimeterM } })), rule);
}

/** The body as it is sent. */
export type SealantBody = {
  units?: 'us' | 'metric';
  walls?: { widthFt: number; heightFt: number; gableHeightFt?: number; openings?: { widthFt: number; heightFt: number; count?: number }[]; corners?: number; pipes?: number }[];
  lengthFt?: number;
  jointWidthIn?: number;
  nominalIn?: 6 | 8 | 10;
  boardFt?: number;
  corners?: number;
  penetrations?: { count: number; perimeterIn?: number };
  wastePercent?: number;
  containers?: { floz: number; priceCents: number }[];
};
