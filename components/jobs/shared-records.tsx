import { RecordCourse } from '@/components/home/record-course';
import { type ShownRecord } from '@/components/home/shown-record';
import { Confirm } from '@/components/ui/confirm';
import { Course } from '@/components/ui/course';
import { exactDay } from '@/lib/calendar-words';
import { type ActionState } from '@/lib/schemas/action-state';
import { type UnitSystem, workKinds } from '@/lib/schemas/vocabulary';

type SharedRecordsProps = {
  records: readonly ShownRecord[];
  walls: readonly { id: string; name: string }[];
  units: UnitSystem;
  /** Records that the reader may take back. */
  own: readonly string[];
  takeBack: (previous: ActionState, form: FormData) => Promise<ActionState>;
};

/** Everything that was done on the home, newest first. */
export function SharedRecords({ records, walls, units, own, takeBack }: SharedRecordsProps) {
  return (
    <section aria-labelledby="record">
      <Course as="div" tone="quiet">
        <h2 id="record">Record</h2>
        {records.length === 0 ? <p className="mt-1 text-quiet">Nothing is logged yet.</p> : null}
      </Course>
      <ul>
        {records.map((record) => (
          <RecordCourse key={record.id} record={record} walls={walls} units={units}>
            {own.includes(record.id) ? (
              <Confirm label="Take back" question={`Take back the ${workKinds[record.kind].toLowerCase()} of ${exactDay(record.doneOn)}?`} confirm="Take it back" action={takeBack} fields={{ recordId: record.id }}>
                <p>The owner’s plan goes on as if it had not been done. You can put it back.</p>
              </Confirm>
            ) : null}
          </RecordCourse>
        ))}
      </ul>
    </section>
  );
}
