import { and, desc, eq, inArray, isNotNull, isNull } from 'drizzle-orm';
import { type Actor, can, Refused } from '@/lib/permissions';
import { type LogWorkInput } from '@/lib/schemas/work';
import { database, transaction } from '../client';
import { homeFor, recordFor } from '../scope';
import { user, wall, workRecord, workRecordWall } from '../schema';
import { type FindingFacts, findingsOf, foundBefore, writeFindings } from './findings';

export type RecordRow = typeof workRecord.$inferSelect;
export type RecordDetail = RecordRow & { wallIds: string[]; byName: string | null; findings: FindingFacts[] };

/** Every record of a home that was not taken back, newest work first, with its walls, who wrote it and how the walls were found. The caller has checked the home. */
export function recordsOfHome(homeId: string): RecordDetail[] {
  const rows = database()
    .select({ record: workRecord, wallId: workRecordWall.wallId, byName: user.name })
    .from(workRecord)
    .innerJoin(workRecordWall, eq(workRecordWall.workRecordId, workRecord.id))
    .leftJoin(user, eq(user.id, workRecord.createdBy))
    .where(and(eq(workRecord.homeId, homeId), isNull(workRecord.removedAt)))
    .orderBy(desc(workRecord.doneOn), desc(workRecord.createdAt), desc(workRecord.id))
    .all();
  const findings = findingsOf(homeId);
  const byId = new Map<string, RecordDetail>();
  for (const { record, wallId, byName } of rows) {
    const detail = byId.get(record.id) ?? { ...record, wallIds: [], byName, findings: findings.filter(({ recordId }) => recordId === record.id) };
    detail.wallIds.push(wallId);
    byId.set(record.id, detail);
  }
  return [...byId.values()];
}

export type LogResult = { record: RecordRow; isNew: boolean };

type LoggedWork = Pick<LogWorkInput, 'homeId' | 'submissionKey' | 'kind' | 'doneOn' | 'wallIds'> & Partial<LogWorkInput>;

/**
 * Logs a piece of work, and how the walls were found with it. The same submission arriving again returns the record that it made.
 * Throws `Refused` when a wall is not (or no longer) one of this home's.
 */
export function logWork(actor: Actor, input: LoggedWork, findings: readonly FindingFacts[] = []): LogResult {
  homeFor(actor, input.homeId, 'work.log');
  return transaction(() => {
    const { wallIds, oldFilm, ...facts } = input;
    const standing = database()
      .select({ id: wall.id })
      .from(wall)
      .where(and(eq(wall.homeId, input.homeId), isNull(wall.removedAt), inArray(wall.id, wallIds)))
      .all();
    if (standing.length !== wallIds.length) throw new Refused('not found', 'A wall that you chose');
    const made = database()
      .insert(workRecord)
      .values({ ...facts, origin: 'logged', createdBy: actor.id })
      .onConflictDoNothing({ target: workRecord.submissionKey })
      .returning()
      .get();
    if (!made) return { record: earlierSubmission(actor, input.submissionKey), isNew: false };
    database().insert(workRecordWall).values(wallIds.map((wallId) => ({ workRecordId: made.id, wallId }))).run();
    writeFindings(made.id, oldFilm ? foundBefore(input.kind, wallIds, oldFilm) : findings);
    return { record: made, isNew: true };
  });
}

function earlierSubmission(actor: Actor, submissionKey: string): RecordRow {
  const row = database().select().from(workRecord).where(and(eq(workRecord.submissionKey, submissionKey), eq(workRecord.createdBy, actor.id))).get();
  if (!row) throw new Refused('not found', 'That submission');
  return row;
}

/** The home that a record, taken back or not, belongs to, if the actor may see it. */
export function homeOfRecord(actor: Actor, recordId: string): string {
  const row = database().select({ homeId: workRecord.homeId }).from(workRecord).where(eq(workRecord.id, recordId)).get();
  if (!row) throw new Refused('not found', 'That work record');
  return homeFor(actor, row.homeId, 'home.view').home.id;
}

/** A record of this home that was taken back and may be put back by the actor. */
export function removedRecord(actor: Actor, homeId: string, recordId: string | undefined): RecordRow | undefined {
  if (!recordId) return undefined;
  const row = database().select().from(workRecord).where(and(eq(workRecord.id, recordId), eq(workRecord.homeId, homeId), isNotNull(workRecord.removedAt))).get();
  const { membership } = homeFor(actor, homeId, 'home.view');
  return row && (row.removedBy === actor.id || can(actor, 'work.remove', { membership, createdBy: row.createdBy })) ? row : undefined;
}

/** Takes a logged record back; it stays in the table with who and when. Returns its home. */
export function removeRecord(actor: Actor, recordId: string, now: Date): RecordRow {
  const { record } = recordFor(actor, recordId, 'work.remove');
  database().update(workRecord).set({ removedAt: now, removedBy: actor.id }).where(eq(workRecord.id, recordId)).run();
  return record;
}

/** Undoes `removeRecord`, for whoever could have removed it. */
export function restoreRecord(actor: Actor, recordId: string): RecordRow {
  const row = database().select().from(workRecord).where(eq(workRecord.id, recordId)).get();
  if (!row?.removedAt) throw new Refused('not found', 'That work record');
  homeFor(actor, row.homeId, row.removedBy === actor.id ? 'work.log' : 'work.remove');
  return database().update(workRecord).set({ removedAt: null, removedBy: null }).where(eq(workRecord.id, recordId)).returning().get();
}

/** Whether the person's submission has made a record, taken back or not. */
export const isLogged = (submissionKey: string, userId: string): boolean =>
  database().select({ id: workRecord.id }).from(workRecord).where(and(eq(workRecord.submissionKey, submissionKey), eq(workRecord.createdBy, userId))).get() !== undefined;
