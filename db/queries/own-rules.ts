import { and, eq, isNull, sql } from 'drizzle-orm';
import { type OwnRule } from '@/lib/care/types';
import { type Actor } from '@/lib/permissions';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { careRule, wall } from '../schema';
import { wallOf } from './walls';

/** The owners' own rules of a home's standing walls. The caller has checked the home. */
export const ownRulesOf = (homeId: string): OwnRule[] =>
  database()
    .select({ wallId: careRule.wallId, kind: careRule.kind, rule: careRule.rule, startOn: careRule.startOn })
    .from(careRule)
    .innerJoin(wall, eq(wall.id, careRule.wallId))
    .where(and(eq(wall.homeId, homeId), isNull(wall.removedAt)))
    .all();

/** Writes an owner's own rule for one kind of work on one wall, in place of an earlier one. The rule has been found valid. */
export function setOwnRule(actor: Actor, homeId: string, wallId: string, kind: WorkKind, { rule, startOn }: Pick<OwnRule, 'rule' | 'startOn'>): void {
  wallOf(actor, homeId, wallId, 'home.edit');
  const facts = { rule, startOn, createdBy: actor.id };
  database()
    .insert(careRule)
    .values({ wallId, kind, ...facts })
    .onConflictDoUpdate({ target: [careRule.wallId, careRule.kind], set: { ...facts, createdAt: sql`excluded.created_at` } })
    .run();
}

/** Goes back to the computed rule. */
export function removeOwnRule(actor: Actor, homeId: string, wallId: string, kind: WorkKind): void {
  wallOf(actor, homeId, wallId, 'home.edit');
  database().delete(careRule).where(and(eq(careRule.wallId, wallId), eq(careRule.kind, kind))).run();
}
