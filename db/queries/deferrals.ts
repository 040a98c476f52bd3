import { and, eq, isNull } from 'drizzle-orm';
import { type CareDeferral } from '@/lib/care/types';
import { database } from '../client';
import { deferral, wall } from '../schema';

/** What was put off at a home and stands. The caller has checked the home. */
export const deferralsOf = (homeId: string): CareDeferral[] =>
  database()
    .select({ workKey: deferral.workKey, notBefore: deferral.notBefore })
    .from(deferral)
    .innerJoin(wall, eq(wall.id, deferral.wallId))
    .where(and(eq(deferral.homeId, homeId), isNull(deferral.withdrawnAt), isNull(wall.removedAt)))
    .all();
