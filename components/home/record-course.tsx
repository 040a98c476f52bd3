import { type ReactNode } from 'react';
import { FoundList } from '@/components/home/found-list';
import { exactDay } from '@/lib/calendar-words';
import { wallWords } from '@/lib/home/wall-words';
import { finishes, sealants, stainBases, type UnitSystem, workKinds } from '@/lib/schemas/vocabulary';
import { volumeText } from '@/lib/units';
import { type ShownRecord } from '@/components/home/shown-record';

type RecordCourseProps = {
  record: ShownRecord;
  walls: readonly { id: string; name: string }[];
  units: UnitSystem;
  /** How to take it back, where the reader may. */
  children?: ReactNode;
};

const dollars = (cents: number) => (cents / 100).toLocaleString('en-US', { style: 'currency', currency: 'USD' });

/** What is known of a piece of work, in the order people ask. */
function facts(record: ShownRecord, units: UnitSystem): string[] {
  return [
    record.product,
    record.finish ? finishes[record.finish] : null,
    record.stainBase ? stainBases[record.stainBase] : null,
    record.sealant ? sealants[record.sealant] : null,
    record.amountL === null ? null : volumeText(record.amountL, units),
    record.costCents === null ? null : dollars(record.costCents),
  ].filter((fact) => fact !== null);
}

/** One piece of logged work as one course. */
export function RecordCourse({ record, walls, units, children }: RecordCourseProps) {
  const on = walls.filter(({ id }) => record.wallIds.includes(id));
  const known = facts(record, units);
  return (
    <li className="course">
      <div className="within grid gap-x-10 gap-y-1 py-5 md:grid-cols-[12rem_minmax(0,1fr)_auto]">
        <time dateTime={record.doneOn} className="figures text-lg">
          {exactDay(record.doneOn)}
        </time>
        <div className="grid gap-1">
          <p className="text-lg">
            <strong>{workKinds[record.kind]}</strong> {on.length > 0 ? wallWords(on, walls.length) : 'a wall that is no longer part of the home'}
          </p>
          {known.length > 0 ? (
            <p>
              {record.colorHex ? <span aria-hidden="true" className="mr-2 inline-block size-4 border border-ink align-middle" style={{ background: record.colorHex }} /> : null}
              {known.join(' · ')}
            </p>
          ) : null}
          <FoundList findings={record.findings} walls={walls} />
          {record.note ? <p className="max-w-prose whitespace-pre-line">{record.note}</p> : null}
          <p className="text-sm text-quiet">{record.origin === 'recalled' ? 'As remembered when the wall was set up' : `Logged by ${record.byName ?? 'somebody who has left'}`}</p>
        </div>
        {children ? <div className="no-print -ml-2 md:ml-0">{children}</div> : null}
      </div>
    </li>
  );
}
