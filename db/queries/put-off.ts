import { and, eq, inArray, isNull } from 'drizzle-orm';
import { type DeferralChoice, deferralChoices } from '@/lib/care/deferral-choices';
import { workKey } from '@/lib/care/work-key';
import { type Actor } from '@/lib/permissions';
import { type WorkKind } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { homeFor } from '../scope';
import { deferral } from '../schema';
import { careHomeAt } from './care-home';
import { itemsOf } from './home-view';

/** One kind of work on some walls of a home, with what putting it off would mean. Throws `Refused`. */
export function putOffChoices(actor: Actor, homeId: string, kind: WorkKind, wallIds: readonly string[], now: Date): DeferralChoice[] {
  homeFor(actor, homeId, 'work.putOff');
  const { home, today } = careHomeAt(homeId, now);
  const items = itemsOf([homeId]).filter((item) => item.kind === kind && wallIds.includes(item.wallId));
  return deferralChoices(home, items, today);
}

/** Puts work off to its next chance; the same wish arriving twice is one. Returns on how many walls there was such work. */
export function putOffWork(actor: Actor, homeId: string, kind: WorkKind, wallIds: readonly string[], now: Date): number {
  const choices = putOffChoices(actor, homeId, kind, wallIds, now);
  for (const { wallId, item, notBefore } of choices) {
    database()
      .insert(deferral)
      .values({ homeId, wallId, kind, workKey: workKey(item), fromOpensOn: item.window.opensOn, notBefore, createdBy: actor.id })
      .onConflictDoNothing()
      .run();
  }
  return choices.length;
}

/** Takes work up again: every putting off of this kind on these walls ends, with who and when. */
export function takeUpWork(actor: Actor, homeId: string, kind: WorkKind, wallIds: readonly string[], now: Date): void {
  homeFor(actor, homeId, 'work.putOff');
  database()
    .update(deferral)
    .set({ withdrawnAt: now, withdrawnBy: actor.id })
    .where(and(eq(deferral.homeId, homeId), eq(deferral.kind, kind), inArray(deferral.wallId, [...wallIds]), isNull(deferral.withdrawnAt)))
    .run();
}
