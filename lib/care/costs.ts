import { type Doer } from '@/lib/schemas/vocabulary';

/** What work on a home costs, in cents: a trip (travel, ladders, covering up), and work and material by size of wall or length of joint. */
export type WorkCosts = {
  doer: Doer;
  tripCents: number;
  /** Wash and one maintenance round of stain, per m² of flat wall. */
  restainCentsPerM2: number;
  /** Stripping first, on top of the restain, per m². */
  stripCentsPerM2: number;
  /** Per m of joint. */
  recaulkCentsPerM: number;
  washCentsPerM2: number;
};

/**
 * Prices that a home starts with; invented by us to be corrected by the owner, not taken from a survey. Own work counts material and
 * hired tools only. The relations are facts of the trade (common practice, no source): stripping costs several times a maintenance coat.
 */
export const exampleCosts: Record<Doer, WorkCosts> = {
  self: { doer: 'self', tripCents: 9000, restainCentsPerM2: 550, stripCentsPerM2: 1400, recaulkCentsPerM: 130, washCentsPerM2: 60 },
  hired: { doer: 'hired', tripCents: 45000, restainCentsPerM2: 2400, stripCentsPerM2: 5200, recaulkCentsPerM: 1150, washCentsPerM2: 450 },
};
