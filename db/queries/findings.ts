import { and, eq, isNull } from 'drizzle-orm';
import { type CareFinding } from '@/lib/care/types';
import { type FilmState, type WorkKind } from '@/lib/schemas/vocabulary';
import { database } from '../client';
import { finding, workRecord } from '../schema';

/** How one wall was found, without the record that it belongs to. */
export type FindingFacts = Pick<typeof finding.$inferSelect, 'wallId' | 'coat' | 'seal' | 'answers'>;

type Joined = CareFinding & Pick<FindingFacts, 'answers'>;

/** How the films of a home's walls were found, of records that were not taken back. The caller has checked the home. */
export const findingsOf = (homeId: string): Joined[] =>
  database()
    .select({ wallId: finding.wallId, recordId: finding.workRecordId, on: workRecord.doneOn, coat: finding.coat, seal: finding.seal, answers: finding.answers })
    .from(finding)
    .innerJoin(workRecord, eq(workRecord.id, finding.workRecordId))
    .where(and(eq(workRecord.homeId, homeId), isNull(workRecord.removedAt)))
    .all();

/** What the renewal of a film says of the film that was on the walls before it. */
export const foundBefore = (kind: WorkKind, wallIds: readonly string[], state: FilmState): FindingFacts[] =>
  wallIds.map((wallId) => ({ wallId, coat: kind === 'restain' ? state : null, seal: kind === 'recaulk' ? state : null, answers: null }));

/** Writes how walls were found along with the record of the work. The caller has made the record. */
export function writeFindings(workRecordId: string, findings: readonly FindingFacts[]): void {
  if (findings.length > 0) database().insert(finding).values(findings.map((one) => ({ workRecordId, ...one }))).run();
}
