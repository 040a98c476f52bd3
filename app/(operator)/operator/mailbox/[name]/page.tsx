import { type Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_server/actor';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { mailboxFolder, readMessage } from '@/jobs/mailbox-read';
import { utcMinute } from '@/lib/calendar-words';
import { framed } from '@/lib/mail/framed';

export const metadata: Metadata = { title: 'Message' };

export default async function MessagePage({ params }: { params: Promise<{ name: string }> }) {
  await requireActor(['operator']);
  const folder = mailboxFolder();
  const message = folder ? await readMessage(folder, (await params).name) : null;
  if (!message) notFound();
  return (
    <main id="main">
      <PageHead
        title={message.subject || '(no subject)'}
        lead={`To ${message.to}${message.date ? `, ${utcMinute(message.date)}` : ''}`}
        path={[{ href: '/operator', label: 'Service' }, { href: '/operator/mailbox', label: 'Mailbox' }]}
      />
      {message.html ? (
        <Course heading="As HTML" aside="Links open in a new tab; scripts and pictures from elsewhere are off">
          <iframe title="The message as HTML" sandbox="allow-popups allow-popups-to-escape-sandbox" srcDoc={framed(message.html)} className="h-[42rem] w-full border border-line bg-white" />
        </Course>
      ) : null}
      <Course heading="As plain text">
        <pre className="max-w-prose text-sm whitespace-pre-wrap wrap-anywhere">{message.text}</pre>
      </Course>
      <Course heading="Headers" tone="quiet">
        <dl className="grid grid-cols-[minmax(0,1fr)] gap-x-6 gap-y-1 text-sm sm:grid-cols-[12rem_minmax(0,1fr)]">
          {message.headers.map(({ name, value }, i) => (
            <div key={i} className="contents">
              <dt className="font-semibold">{name}</dt>
              <dd className="wrap-anywhere">{value}</dd>
            </div>
          ))}
        </dl>
      </Course>
    </main>
  );
}
