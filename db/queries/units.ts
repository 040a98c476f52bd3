import { eq } from 'drizzle-orm';
import { type Actor } from '@/lib/permissions';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { user } from '../schema';

/** The system in which a person reads and writes lengths, areas and volumes. */
export const unitsOf = (actor: Actor): UnitSystem =>
  database().select({ units: user.units }).from(user).where(eq(user.id, actor.id)).get()?.units ?? 'us';
