import { and, eq, isNotNull } from 'drizzle-orm';
import { database } from '../client';
import { user } from '../schema';

/** Whether mail to this address comes back for good and nobody has lifted that. */
export const isAddressBounced = (address: string): boolean =>
  database().select({ id: user.id }).from(user).where(and(eq(user.email, address.trim().toLowerCase()), isNotNull(user.bouncedAt))).get() !== undefined;
