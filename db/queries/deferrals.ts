import { and, eq, isNull } from 'drizzle-orm';
import { type CareDeferral } from '@/lib/care/types';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { deferral, wall } from '../schema';

const standing = (homeId: string) => and(eq(deferral.homeId, homeId), isNull(deferral.withdrawnAt), isNull(wall.removedAt));

/** What was put off at a home and stands. The caller has checked the home. */
export const deferralsOf = (homeId: string): CareDeferral[] =>
  database().select({ workKey: deferral.workKey, notBefore: deferral.notBefore }).from(deferral).innerJoin(wall, eq(wall.id, deferral.wallId)).where(standing(homeId)).all();

/** The kinds of work and walls of which something was put off and stands. The caller has checked the home. */
export const putOffAt = (homeId: string): { wallId: string; kind: WorkKind; notBefore: string }[] =>
  database().select({ wallId: deferral.wallId, kind: deferral.kind, notBefore: deferral.notBefore }).from(deferral).innerJoin(wall, eq(wall.id, deferral.wallId)).where(standing(homeId)).all();
