import { type ReactNode } from 'react';
import { Course, type Tone } from '@/components/ui/course';
import { utcMinute } from '@/lib/calendar-words';
import { mailStates, type OutboxMail } from '@/lib/schemas/outbox';

const tones: Record<OutboxMail['state'], Tone> = { queued: 'honey', sending: 'honey', sent: 'plain', refused: 'ember', cancelled: 'quiet' };

function whenOf(mail: OutboxMail): string {
  if (mail.sentAt) return `Sent ${utcMinute(new Date(mail.sentAt))}`;
  if (mail.state === 'queued') return `Next try ${utcMinute(new Date(mail.nextAttemptAt))}`;
  return `Made ${utcMinute(new Date(mail.createdAt))}`;
}

/** One mail as a band: who, what, how it stands; `children` holds what can be done. */
export function MailCourse({ mail, children }: { mail: OutboxMail; children: ReactNode }) {
  return (
    <Course as="article" heading={mailStates[mail.state]} aside={whenOf(mail)} tone={tones[mail.state]}>
      <div className="flex flex-wrap items-start justify-between gap-4">
        <div className="min-w-0">
          <p className="font-semibold">{mail.subject ?? `Not written yet: ${mail.kind}${mail.homeName ? ` for ${mail.homeName}` : ''}`}</p>
          <p>To {mail.to}</p>
          {mail.about.length > 0 ? (
            <ul className="mt-1 list-disc pl-5 text-sm">
              {mail.about.map((line) => (
                <li key={line}>{line}</li>
              ))}
            </ul>
          ) : null}
          <p className="mt-1 text-sm text-quiet">
            Kind: {mail.kind} · {mail.attempts} {mail.attempts === 1 ? 'attempt' : 'attempts'}
          </p>
          {mail.lastError ? <p className="mt-1 text-sm break-words">{mail.lastError}</p> : null}
        </div>
        {children}
      </div>
    </Course>
  );
}
