import { eq } from 'drizzle-orm';
import { exampleCosts, type WorkCosts } from '@/lib/care/costs';
import { database } from '../client';
import { homeCost } from '../schema';

/** What work costs at a home as its owner said; the example prices of own work where nobody did. The caller has checked the home. */
export function costsOf(homeId: string): WorkCosts {
  const row = database().select().from(homeCost).where(eq(homeCost.homeId, homeId)).get();
  if (!row) return exampleCosts.self;
  const { doer, tripCents, restainCentsPerM2, stripCentsPerM2, recaulkCentsPerM, washCentsPerM2 } = row;
  return { doer, tripCents, restainCentsPerM2, stripCentsPerM2, recaulkCentsPerM, washCentsPerM2 };
}
