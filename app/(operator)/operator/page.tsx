import { type Metadata, type Route } from 'next';
import Link from 'next/link';
import { requireActor } from '@/app/_server/actor';
import { Course } from '@/components/ui/course';
import { ActionForm } from '@/components/ui/action-form';
import { PageHead } from '@/components/ui/page-head';
import { SubmitButton } from '@/components/ui/submit-button';
import { bouncedPeople } from '@/db/queries/bounces';
import { recentJobRuns } from '@/db/queries/job-runs';
import { listMails } from '@/db/queries/mail-view';
import { mailStates, type MailStateName } from '@/lib/schemas/outbox';
import { runRemindersNow } from './actions';
import { JobRuns } from './job-runs';
import { NeedsALook } from './needs-a-look';

export const metadata: Metadata = { title: 'Service' };

export default async function OperatorPage() {
  const actor = await requireActor(['operator']);
  const runs = recentJobRuns(actor, 20);
  const { counts } = listMails(actor, 1);
  const { people, total } = bouncedPeople(actor);
  const refused = listMails(actor, 1, 'refused').mails.slice(0, 5);
  const look = counts.refused + total === 0 ? 'Nothing needs a look.' : `To look at: refused mails ${counts.refused}, addresses that mail comes back from ${total}.`;
  return (
    <main id="main">
      <PageHead title="How the service stands" lead={`Whether reminders went out, and what became of every mail. ${look}`} />
      <NeedsALook refused={refused} refusedTotal={counts.refused} bounced={people} bouncedTotal={total} />
      <Course heading="Outbox" aside="All mails so far">
        <dl className="grid grid-cols-2 gap-4 sm:grid-cols-5">
          {(Object.keys(mailStates) as MailStateName[]).map((state) => (
            <div key={state}>
              <dt className="text-sm text-quiet">{mailStates[state]}</dt>
              <dd className="figures text-2xl">
                <Link className="link" href={`/operator/outbox?state=${state}` as Route}>
                  {counts[state]}
                </Link>
              </dd>
            </div>
          ))}
        </dl>
      </Course>
      <Course heading="Reminders" aside="By themselves every hour">
        <ActionForm action={runRemindersNow} saved="The run is done. Its figures are in the first line below.">
          <p className="max-w-prose">Plans lapsed homes anew, queues what is due and sends the outbox. Nothing is ever sent twice.</p>
          <div>
            <SubmitButton pendingLabel="Running…">Run reminders now</SubmitButton>
          </div>
        </ActionForm>
      </Course>
      <Course heading="Last runs" aside="Newest first">
        <JobRuns runs={runs} />
      </Course>
    </main>
  );
}
