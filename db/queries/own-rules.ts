import { and, eq, isNull } from 'drizzle-orm';
import { type OwnRule } from '@/lib/care/types';
import { database } from '../client';
import { careRule, wall } from '../schema';

/** The owners' own rules of a home's standing walls. The caller has checked the home. */
export const ownRulesOf = (homeId: string): OwnRule[] =>
  database()
    .select({ wallId: careRule.wallId, kind: careRule.kind, rule: careRule.rule, startOn: careRule.startOn })
    .from(careRule)
    .innerJoin(wall, eq(wall.id, careRule.wallId))
    .where(and(eq(wall.homeId, homeId), isNull(wall.removedAt)))
    .all();
