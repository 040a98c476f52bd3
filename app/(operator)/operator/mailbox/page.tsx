import { type Metadata, type Route } from 'next';
import Link from 'next/link';
import { requireActor } from '@/app/_server/actor';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { listMessages, mailboxFolder } from '@/jobs/mailbox-read';
import { utcMinute } from '@/lib/calendar-words';
import { outboxQuery } from '@/lib/schemas/outbox';

export const metadata: Metadata = { title: 'Mailbox' };

const perPage = 50;

export default async function MailboxPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  await requireActor(['operator']);
  const folder = mailboxFolder();
  const { page } = outboxQuery.parse(await searchParams);
  return (
    <main id="main">
      <PageHead title="Mailbox" lead="What the local mail fake received, newest first. Nothing here has left this machine." path={[{ href: '/operator', label: 'Service' }]} />
      {folder ? <Messages folder={folder} page={page} /> : <NoMailbox />}
    </main>
  );
}

function NoMailbox() {
  return (
    <Course heading="No mailbox here" as="section">
      <p className="max-w-prose">
        This service runs without the local mail fake (MAILBOX_DIR is not set), so its mails go out for real and are not kept. What became of each one is in the{' '}
        <Link className="link" href={'/operator/outbox' as Route}>outbox</Link>.
      </p>
    </Course>
  );
}

async function Messages({ folder, page }: { folder: string; page: number }) {
  const { total, messages } = await listMessages(folder, (page - 1) * perPage, perPage);
  if (messages.length === 0) {
    return (
      <Course as="div">
        <p>{total === 0 ? 'No message yet. Sign up with a new address, ask for a sign-in link or run the reminders, and it arrives here.' : 'There are no messages on this page.'}</p>
      </Course>
    );
  }
  return (
    <>
      {messages.map((message) => (
        <Course key={message.name} as="article" level={2} heading={<Link className="link" href={`/operator/mailbox/${message.name}` as Route}>{message.subject || '(no subject)'}</Link>} aside={message.date ? utcMinute(message.date) : ''}>
          <p>To {message.to}</p>
        </Course>
      ))}
      {total > page * perPage ? (
        <Course as="div" tone="quiet">
          <Link className="link inline-flex min-h-11 items-center" href={`/operator/mailbox?page=${page + 1}` as Route}>Older messages</Link>
        </Course>
      ) : null}
    </>
  );
}
