import { type Metadata } from 'next';
import { pageHome } from '@/app/_server/page-data';
import { whatWasSaid } from '@/app/_server/said';
import { RecordCourse } from '@/components/home/record-course';
import { Said } from '@/components/home/said';
import { Undo } from '@/components/home/undo';
import { LinkButton } from '@/components/ui/button';
import { Confirm } from '@/components/ui/confirm';
import { Course } from '@/components/ui/course';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHead } from '@/components/ui/page-head';
import { unitsOf } from '@/db/queries/units';
import { removedRecord } from '@/db/queries/work';
import { exactDay } from '@/lib/calendar-words';
import { can } from '@/lib/permissions';
import { workKinds } from '@/lib/schemas/vocabulary';
import { putBack, takeBack } from './actions';

export const metadata: Metadata = { title: 'Record' };

type Props = { params: Promise<{ homeId: string }>; searchParams: Promise<{ removed?: string }> };

export default async function RecordPage({ params, searchParams }: Props) {
  const { actor, view } = await pageHome((await params).homeId);
  const { home, membership, records } = view;
  const gone = removedRecord(actor, home.id, (await searchParams).removed);
  const units = unitsOf(actor);
  const walls = view.walls.map(({ wall }) => wall);
  const named = (record: { kind: keyof typeof workKinds; doneOn: string }) => `${workKinds[record.kind].toLowerCase()} of ${exactDay(record.doneOn)}`;
  const logWork = { href: `/homes/${home.id}/log`, label: 'Log work' };
  return (
    <main id="main">
      <PageHead title="Record" lead="Everything that was done on this home, newest first." path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${home.id}`, label: home.name }]} actions={<LinkButton href={logWork.href}>{logWork.label}</LinkButton>} />
      <Said words={await whatWasSaid()} />
      {gone ? <Undo done={`The ${named(gone)} was taken back.`} label="Put it back" action={putBack} fields={{ recordId: gone.id }} /> : null}
      {records.length === 0 ? (
        <Course as="div">
          <EmptyState title="Nothing is logged yet" action={logWork}>
            <p>Log the last coat or the last caulk, even years late: from its day on the plan counts. The record is what a buyer, an insurer or a warranty claim asks for.</p>
          </EmptyState>
        </Course>
      ) : (
        <ul>
          {records.map((record) => (
            <RecordCourse key={record.id} record={record} walls={walls} units={units}>
              {can(actor, 'work.remove', { membership, createdBy: record.createdBy }) ? (
                <Confirm label="Take back" question={`Take back the ${named(record)}?`} confirm="Take it back" action={takeBack} fields={{ recordId: record.id }}>
                  <p>The plan goes on as if it had not been done. You can put it back.</p>
                </Confirm>
              ) : null}
            </RecordCourse>
          ))}
        </ul>
      )}
    </main>
  );
}
