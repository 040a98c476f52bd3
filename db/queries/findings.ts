import { and, eq, isNull } from 'drizzle-orm';
import { type CareFinding } from '@/lib/care/types';
import { database } from '../client';
import { finding, workRecord } from '../schema';

/** How the films of a home's walls were found, of records that were not taken back. The caller has checked the home. */
export const findingsOf = (homeId: string): CareFinding[] =>
  database()
    .select({ wallId: finding.wallId, recordId: finding.workRecordId, on: workRecord.doneOn, coat: finding.coat, seal: finding.seal })
    .from(finding)
    .innerJoin(workRecord, eq(workRecord.id, finding.workRecordId))
    .where(and(eq(workRecord.homeId, homeId), isNull(workRecord.removedAt)))
    .all();
