import { createTransport } from 'nodemailer';

export type Envelope = {
  from: string;
  to: { name: string; address: string };
  subject: string;
  html: string;
  text: string;
  messageId: string;
  headers: Record<string, string>;
};

/** What delivery needs of a way to send. */
export type MailTransport = { sendMail: (envelope: Envelope) => Promise<unknown> };

/** SMTP with time limits that stay well under a claim's lease (db/queries/mail.ts). */
export const smtpTransport = (url: string): MailTransport =>
  createTransport({ url, connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 20_000, dnsTimeout: 10_000, disableFileAccess: true, disableUrlAccess: true });

export type Failure = { kind: 'refused' | 'later' | 'no connection'; message: string };

/**
 * Sorts what went wrong. A 5xx answer to the recipient or the message stops this mail (RFC 5321 §4.2.1: permanent), and so
 * does an address that cannot be written; everything else, also a refused sender or sign-in (our own set-up), comes again later.
 * 'no connection' means that other mails would fare no better now.
 */
export function failureOf(error: unknown): Failure {
  const { responseCode, command = '', message } = error as { responseCode?: number; command?: string; message?: string };
  const said = (message ?? String(error)).replace(/\s+/g, ' ').slice(0, 500);
  const permanent = (command === 'RCPT TO' || command === 'DATA') && responseCode !== undefined && responseCode >= 500;
  if (permanent || (command === 'API' && /^(Invalid recipient|No recipients)/.test(said))) return { kind: 'refused', message: said };
  return { kind: command === 'CONN' || command.startsWith('AUTH') ? 'no connection' : 'later', message: said };
}
