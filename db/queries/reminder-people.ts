import { and, eq, inArray, isNotNull, isNull } from 'drizzle-orm';
import { database } from '../client';
import { home, homeMember, user } from '../schema';

/** Who is reminded: owners, co-owners and caretakers with a confirmed address that mail reaches and reminders on, of homes in use that they have not stopped reminders of. Joins home, home_member and user. */
export const wantsReminders = () =>
  and(
    isNull(home.archivedAt),
    inArray(homeMember.membership, ['owner', 'co-owner', 'caretaker']),
    eq(user.remindersOn, true),
    isNotNull(user.emailVerified),
    isNull(user.bouncedAt),
    isNull(homeMember.remindersStoppedAt),
  );

export type Recipient = { userId: string; email: string };

export const recipientsOf = (homeId: string): Recipient[] =>
  database()
    .select({ userId: user.id, email: user.email })
    .from(homeMember)
    .innerJoin(user, eq(user.id, homeMember.userId))
    .innerJoin(home, eq(home.id, homeMember.homeId))
    .where(and(eq(homeMember.homeId, homeId), wantsReminders()))
    .all();
