import { eq } from 'drizzle-orm';
import { exampleCosts, type WorkCosts } from '@/lib/care/costs';
import { type Actor } from '@/lib/permissions';
import { database } from '../client';
import { homeFor } from '../scope';
import { homeCost } from '../schema';

const rowOf = (homeId: string) => database().select().from(homeCost).where(eq(homeCost.homeId, homeId)).get();

/** What work costs at a home as its owner said; the example prices of own work where nobody did. The caller has checked the home. */
export function costsOf(homeId: string): WorkCosts {
  const row = rowOf(homeId);
  if (!row) return exampleCosts.self;
  const { doer, tripCents, restainCentsPerM2, stripCentsPerM2, recaulkCentsPerM, washCentsPerM2 } = row;
  return { doer, tripCents, restainCentsPerM2, stripCentsPerM2, recaulkCentsPerM, washCentsPerM2 };
}

/** When somebody said what work costs at a home; null while the example prices stand in. The caller has checked the home. */
export const costsSetAt = (homeId: string): Date | null => rowOf(homeId)?.setAt ?? null;

/** Keeps what work costs at a home, in place of what was said before. Throws `Refused`. */
export function setCosts(actor: Actor, homeId: string, costs: WorkCosts, now: Date): void {
  homeFor(actor, homeId, 'home.edit');
  const facts = { ...costs, setBy: actor.id, setAt: now };
  database().insert(homeCost).values({ homeId, ...facts }).onConflictDoUpdate({ target: homeCost.homeId, set: facts }).run();
}
