import { z } from 'zod';

/** How a mail stands. Labels are what the operator reads. */
export const mailStates = { queued: 'Waiting', sending: 'Being sent', sent: 'Sent', refused: 'Refused', cancelled: 'Not needed any more' } as const;
export type MailStateName = keyof typeof mailStates;

/** The query of the outbox, in the page's address and in GET /api/operator/mail. */
export const outboxQuery = z.object({
  page: z.coerce.number().int().min(1).max(100_000).default(1).catch(1),
  state: z.enum(Object.keys(mailStates) as [MailStateName, ...MailStateName[]]).optional().catch(undefined),
});
export type OutboxQuery = z.output<typeof outboxQuery>;

/** One mail as JSON carries it; instants are ISO 8601 in UTC. */
export type OutboxMail = {
  id: string;
  kind: string;
  to: string;
  homeName: string | null;
  subject: string | null;
  state: MailStateName;
  attempts: number;
  createdAt: string;
  sentAt: string | null;
  nextAttemptAt: string;
  lastError: string | null;
  about: string[];
};
export type OutboxPage = { mails: OutboxMail[]; page: number; pages: number; counts: Record<MailStateName, number> };
