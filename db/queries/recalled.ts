import { and, eq, isNull } from 'drizzle-orm';
import { type Actor } from '@/lib/permissions';
import { database } from '../client';
import { type wall, workRecord, workRecordWall } from '../schema';

/** One recalled record a wall and kind of work: its key says so. */
const recalledKey = (wallId: string, kind: 'restain' | 'recaulk') => `recalled:${wallId}:${kind}`;

/** Writes, moves or takes away what the owner remembers of a wall's last stain or caulk. Null means not known. */
export function recallWork(actor: Actor, row: typeof wall.$inferSelect, kind: 'restain' | 'recaulk', doneOn: string | null): void {
  const submissionKey = recalledKey(row.id, kind);
  if (doneOn === null) {
    database().delete(workRecord).where(eq(workRecord.submissionKey, submissionKey)).run();
    return;
  }
  const record = database()
    .insert(workRecord)
    .values({ homeId: row.homeId, kind, doneOn, origin: 'recalled', submissionKey, createdBy: actor.id })
    .onConflictDoUpdate({ target: workRecord.submissionKey, set: { doneOn, removedAt: null, removedBy: null } })
    .returning()
    .get();
  database().insert(workRecordWall).values({ workRecordId: record.id, wallId: row.id }).onConflictDoNothing().run();
}

/** What is remembered of a wall and was not taken back, for its form. */
export function recalledDays(wallId: string): { stained: string | null; caulked: string | null } {
  const dayOf = (kind: 'restain' | 'recaulk') =>
    database().select({ doneOn: workRecord.doneOn }).from(workRecord).where(and(eq(workRecord.submissionKey, recalledKey(wallId, kind)), isNull(workRecord.removedAt))).get()?.doneOn ?? null;
  return { stained: dayOf('restain'), caulked: dayOf('recaulk') };
}
