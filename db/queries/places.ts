import { eq } from 'drizzle-orm';
import { database } from '../client';
import { postalCode } from '../schema';

export type PostalPlace = typeof postalCode.$inferSelect;

/** Where a US postal code is. Public data: no actor. Undefined for a code that the table does not hold. */
export const findPostalCode = (code: string): PostalPlace | undefined =>
  database().select().from(postalCode).where(eq(postalCode.code, code)).get();
