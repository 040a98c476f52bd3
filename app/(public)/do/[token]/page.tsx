import { type Metadata } from 'next';
import { mailLinkOf } from '@/app/_server/mail-link';
import { ActionForm } from '@/components/ui/action-form';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { Field } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { SubmitButton } from '@/components/ui/submit-button';
import { linkedWork } from '@/db/queries/linked-work';
import { type MailLink } from '@/db/queries/mail-links';
import { putOffChoices } from '@/db/queries/put-off';
import { homeToStop } from '@/db/queries/reminder-stops';
import { waitWords } from '@/lib/care/deferral-choices';
import { workKinds } from '@/lib/schemas/vocabulary';
import { doIt } from './actions';

export const metadata: Metadata = { title: 'From your mail', referrer: 'no-referrer', robots: { index: false, follow: false } };

type Question = { title: string; lead: string; button: string; done: string; day?: string };

function questionOf(link: MailLink, now: Date): Question | null {
  if (link.action === 'stop home') {
    const home = homeToStop(link.userId, link.homeId);
    const lead = home?.stopped ? 'They are stopped already.' : 'Nobody else’s reminders change. You can turn them on again in your account.';
    return home && { title: `Stop all reminders of ${home.name}?`, lead, button: 'Stop them', done: 'Stopped. No more reminders of this home come to you.' };
  }
  const work = linkedWork(link, now);
  if (!work) return null;
  const { actor, homeId, item, wallName, today } = work;
  const what = `${workKinds[item.kind].toLowerCase()} of ${wallName}`;
  if (link.action === 'log') {
    const lead = `It is logged in the name of ${actor.name ?? actor.email}. Change the day if it was done earlier.`;
    return { title: `Log the ${what} as done?`, lead, button: 'Log it', done: 'Logged. To take it back, sign in and open the record.', day: today };
  }
  if (link.action === 'stop') return { title: `No more reminders of the ${what}?`, lead: 'The work stays in the plan. Other reminders still come.', button: 'Stop reminding me', done: 'You will get no more reminders of it.' };
  const [choice] = putOffChoices(actor, homeId, item.kind, [item.wallId], now);
  return choice ? { title: `Put off the ${what}?`, lead: waitWords(choice), button: 'Put it off', done: 'Put off to its next season.' } : null;
}

const gone = 'The work is done, has changed, or is no longer yours to look after. Sign in to see the plan as it is.';

/** What a link from a mail will do, and a button that does it. Opening the page changes nothing. */
export default async function DoPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const now = new Date();
  const link = await mailLinkOf(token, now);
  const question = typeof link === 'string' ? null : questionOf(link, now);
  if (!question) {
    return (
      <>
        <PageHead title="Nothing to do here" lead={typeof link === 'string' ? link : gone} />
        <Course><LinkButton href="/sign-in">Sign in</LinkButton></Course>
      </>
    );
  }
  return (
    <>
      <PageHead title={question.title} lead={question.lead} />
      <Course>
        <ActionForm action={doIt} saved={question.done}>
          <input type="hidden" name="token" value={token} />
          {question.day ? <Field label="Done on" name="doneOn" type="date" defaultValue={question.day} max={question.day} required /> : null}
          <SubmitButton>{question.button}</SubmitButton>
        </ActionForm>
      </Course>
    </>
  );
}
