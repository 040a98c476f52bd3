import { type Route } from 'next';
import Link from 'next/link';
import { ActionForm } from '@/components/ui/action-form';
import { Course } from '@/components/ui/course';
import { SubmitButton } from '@/components/ui/submit-button';
import { type BouncedPerson } from '@/db/queries/bounces';
import { type MailView } from '@/db/queries/mail-view';
import { utcMinute } from '@/lib/calendar-words';
import { sendToAddressAgain } from './actions';

type NeedsALookProps = { refused: MailView[]; refusedTotal: number; bounced: BouncedPerson[]; bouncedTotal: number };

/** Mails that were refused for good, and addresses that mail comes back from. Nothing is shown when there is nothing to look at. */
export function NeedsALook({ refused, refusedTotal, bounced, bouncedTotal }: NeedsALookProps) {
  if (refusedTotal + bouncedTotal === 0) return null;
  return (
    <Course heading="Needs a look" aside="Does not mend by itself" tone="ember">
      {bounced.length > 0 ? (
        <section>
          <h3>Mail comes back from {countOf(bouncedTotal, 'address', 'addresses')}</h3>
          <p className="max-w-prose">No reminders go there. Links to sign in, to confirm the address or to set a new password are still tried.</p>
          <ul className="mt-3 grid gap-4">
            {bounced.map((person) => (
              <li key={person.userId} className="flex flex-wrap items-start justify-between gap-4 border-t border-line pt-3">
                <div className="min-w-0">
                  <p className="font-semibold break-words">{person.name ? `${person.name}, ${person.email}` : person.email}</p>
                  <p className="text-sm">Since {utcMinute(person.bouncedAt)}{person.status ? `, code ${person.status}` : ''}</p>
                  {person.detail ? <p className="text-sm break-words text-quiet">{person.detail}</p> : null}
                </div>
                <ActionForm action={sendToAddressAgain} saved="Mail goes to this address again.">
                  <input type="hidden" name="userId" value={person.userId} />
                  <SubmitButton look="quiet" pendingLabel="Saving…">
                    Send to it again<span className="sr-only"> ({person.email})</span>
                  </SubmitButton>
                </ActionForm>
              </li>
            ))}
          </ul>
        </section>
      ) : null}
      {refused.length > 0 ? (
        <section className={bounced.length > 0 ? 'mt-6' : ''}>
          <h3>{countOf(refusedTotal, 'mail was', 'mails were')} refused</h3>
          <ul className="mt-3 grid gap-3">
            {refused.map((mail) => (
              <li key={mail.id} className="border-t border-line pt-3">
                <p className="font-semibold break-words">{mail.subject ?? mail.kind} – to {mail.toAddress}</p>
                {mail.lastError ? <p className="text-sm break-words">{mail.lastError}</p> : null}
              </li>
            ))}
          </ul>
          <Link className="link mt-3 inline-flex min-h-11 items-center" href={'/operator/outbox?state=refused' as Route}>
            All refused mails, and trying them again
          </Link>
        </section>
      ) : null}
    </Course>
  );
}

const countOf = (n: number, one: string, more: string) => `${n} ${n === 1 ? one : more}`;
