'use client';

import { type Route } from 'next';
import Link from 'next/link';
import { useState } from 'react';
import useSWR from 'swr';
import { Button } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { FormMessage } from '@/components/ui/form-message';
import { mailStates, type MailStateName, type OutboxMail, type OutboxPage, type OutboxQuery } from '@/lib/schemas/outbox';
import { MailCourse } from './mail-course';

const address = ({ page, state }: OutboxQuery) => new URLSearchParams({ page: String(page), ...(state ? { state } : {}) }).toString();

async function read(url: string): Promise<OutboxPage> {
  const response = await fetch(url);
  if (!response.ok) throw new Error(`${response.status}`);
  return (await response.json()) as OutboxPage;
}

const outcomes: Record<string, string> = { sent: 'was sent', retried: 'could not be sent yet and waits again', refused: 'was refused', cancelled: 'is not needed any more', heldUp: 'waits: the mail server did not serve us' };

async function retry(mail: OutboxMail): Promise<{ tone: 'done' | 'fault'; words: string }> {
  try {
    const response = await fetch(`/api/operator/mail/${mail.id}/retry`, { method: 'POST' });
    const answer = (await response.json()) as { state?: string; detail?: string };
    if (!response.ok) return { tone: 'fault', words: answer.detail ?? 'It could not be retried.' };
    return { tone: answer.state === 'sent' ? 'done' : 'fault', words: `The mail to ${mail.to} ${outcomes[answer.state ?? ''] ?? 'is queued'}.` };
  } catch {
    return { tone: 'fault', words: 'No answer: the connection may be down. The mail is as it was.' };
  }
}

/** The list keeps itself fresh: it reads again every 20 seconds and when the window comes back. */
export function Outbox({ query, first }: { query: OutboxQuery; first: OutboxPage }) {
  const { data = first, error, mutate } = useSWR<OutboxPage, Error>(`/api/operator/mail?${address(query)}`, read, { fallbackData: first, refreshInterval: 20_000, revalidateOnMount: false });
  const [busy, setBusy] = useState<string | null>(null);
  const [said, setSaid] = useState<{ tone: 'done' | 'fault'; words: string } | null>(null);
  const onRetry = async (mail: OutboxMail) => {
    setBusy(mail.id);
    setSaid(await retry(mail));
    await mutate();
    setBusy(null);
  };
  return (
    <>
      <Course tone="quiet" as="div">
        <Filter query={query} counts={data.counts} />
        <div aria-live="polite" className="mt-4 empty:hidden">
          {said ? <FormMessage tone={said.tone}>{said.words}</FormMessage> : null}
          {error ? <FormMessage tone="note">The list could not be read again just now; it shows what was known before.</FormMessage> : null}
        </div>
      </Course>
      {data.mails.length === 0 ? <Course as="div"><p>No mail here. Mails appear when somebody signs up, asks for a link, shares a home or is reminded.</p></Course> : null}
      {data.mails.map((mail) => (
        <MailCourse key={mail.id} mail={mail}>
          {mail.state === 'refused' || mail.state === 'queued' ? (
            <Button look="quiet" pending={busy === mail.id} pendingLabel="Trying…" onClick={() => void onRetry(mail)}>
              Try now<span className="sr-only"> to send the mail to {mail.to}</span>
            </Button>
          ) : null}
        </MailCourse>
      ))}
      {data.pages > 1 ? <Pages query={query} page={data.page} pages={data.pages} /> : null}
    </>
  );
}

function Filter({ query, counts }: { query: OutboxQuery; counts: OutboxPage['counts'] }) {
  const all = Object.values(counts).reduce((sum, n) => sum + n, 0);
  const link = (state: MailStateName | undefined, label: string, n: number) => (
    <li key={label}>
      <Link href={`/operator/outbox?${address({ page: 1, state })}` as Route} aria-current={query.state === state ? 'page' : undefined} className="link inline-flex min-h-11 items-center aria-[current=page]:font-bold aria-[current=page]:no-underline">
        {label} ({n})
      </Link>
    </li>
  );
  return (
    <nav aria-label="Which mails">
      <ul className="flex flex-wrap gap-x-6">
        {link(undefined, 'All', all)}
        {(Object.keys(mailStates) as MailStateName[]).map((state) => link(state, mailStates[state], counts[state]))}
      </ul>
    </nav>
  );
}

function Pages({ query, page, pages }: { query: OutboxQuery; page: number; pages: number }) {
  const link = (to: number, label: string) => (
    <Link className="link inline-flex min-h-11 items-center" href={`/operator/outbox?${address({ ...query, page: to })}` as Route}>
      {label}
    </Link>
  );
  return (
    <Course tone="quiet" as="div">
      <nav aria-label="Pages" className="flex items-center gap-6">
        {page > 1 ? link(page - 1, 'Newer') : null}
        <span>Page {page} of {pages}</span>
        {page < pages ? link(page + 1, 'Older') : null}
      </nav>
    </Course>
  );
}
