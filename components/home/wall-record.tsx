import { type ComponentProps } from 'react';
import { RecordCourse } from '@/components/home/record-course';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';

type RecordProps = ComponentProps<typeof RecordCourse>;
type WallRecordProps = Pick<RecordProps, 'walls' | 'units'> & { homeId: string; records: readonly RecordProps['record'][] };

/** The work done on one wall, newest first. */
export function WallRecord({ homeId, records, walls, units }: WallRecordProps) {
  return (
    <>
      <Course heading="Done on this wall" aside={<LinkButton href={`/homes/${homeId}/record`} look="plain">The whole record</LinkButton>}>
        <p className="text-quiet">{records.length === 0 ? 'Nothing yet.' : `${records.length} ${records.length === 1 ? 'piece' : 'pieces'} of work, newest first.`}</p>
      </Course>
      <ul>
        {records.map((record) => (
          <RecordCourse key={record.id} record={record} walls={walls} units={units} />
        ))}
      </ul>
    </>
  );
}
