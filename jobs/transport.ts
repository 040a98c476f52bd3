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
export type MailTransport = { sendMail: (envelope: Envelope) => Promise<unknown>; close?: () => void };

/** Connections to the mail server at one time, and so mails in the air. */
export const connections = 4;

/** Time limits that stay well under a claim's lease (db/queries/mail.ts). */
const limits = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 20_000, dnsTimeout: 10_000, disableFileAccess: true, disableUrlAccess: true };

/** SMTP with a connection for each mail. */
export const smtpTransport = (url: string): MailTransport => createTransport({ url, ...limits });

/** SMTP over a few connections that stay open until `close`. A mail is never sent again by the pool itself: that is the outbox's to decide. */
export const smtpPool = (url: string): MailTransport => createTransport({ pool: true, maxConnections: connections, maxMessages: Infinity, maxRequeues: 0, url, ...limits });

/**
 * refused: nobody will take this mail. later: this mail has to wait. dropped: the line was cut in the middle. server: the mail
 * server as a whole does not serve us now, and other mails would fare no better.
 */
export type Failure = { kind: 'refused' | 'later' | 'dropped' | 'server'; message: string };

/** Sign-in wanted or wrong (530, 534, 535, 538: RFC 4954 §6), closing (421: RFC 5321 §4.2.2), takes no mail at all (521: RFC 7504). */
const ofTheSession = [421, 521, 530, 534, 535, 538];

/** Security or policy (5.7.x: RFC 3463 §3.8), such as relaying that is not allowed: likely our own set-up, so it is tried again. */
const isPolicy = (said: string) => /\b5\d\d[ -]5\.7\.\d+/.test(said);

/** A message that is too large (552, 5.3.4) is its own fault even at MAIL FROM. */
const isTooLarge = (code: number | undefined, said: string) => code === 552 || /\b5\.3\.4\b/.test(said);

/**
 * Sorts what went wrong. A 5xx answer to the recipient or the message stops this mail (RFC 5321 §4.2.1: permanent), and so
 * does an address that cannot be written; a refused sender or sign-in is our own set-up and the server's trouble.
 */
export function failureOf(error: unknown): Failure {
  const { responseCode, command = '', code = '', message, response } = error as { responseCode?: number; command?: string; code?: string; message?: string; response?: string };
  const said = (message ?? String(error)).replace(/\s+/g, ' ').slice(0, 500);
  return { kind: kindOf({ answered: responseCode, command, code, said, response: response ?? said }), message: said };
}

type Trouble = { answered: number | undefined; command: string; code: string; said: string; response: string };

function kindOf({ answered, command, code, said, response }: Trouble): Failure['kind'] {
  if (command === 'API' && /^(Invalid recipient|No recipients)/.test(said)) return 'refused';
  if (/^Reached maximum number of retries/.test(said)) return 'dropped';
  if (command === 'API' && !/^(Invalid sender|Missing credentials)/.test(said)) return 'later';
  if (answered !== undefined && ofTheSession.includes(answered)) return 'server';
  const aboutThisMail = command === 'RCPT TO' || command === 'DATA';
  if (aboutThisMail && answered !== undefined) return answered < 500 || isPolicy(response) ? 'later' : 'refused';
  if (command === 'MAIL FROM') return isTooLarge(answered, response) ? 'refused' : 'server';
  if (command === 'CONN' && answered === undefined && isCut(code, said)) return 'dropped';
  return aboutThisMail ? 'later' : 'server';
}

/** A connection that stood and broke, or fell silent, as opposed to one that never came about. */
const isCut = (code: string, said: string) => /closed|reset|EPIPE|^Timeout$/i.test(said) && !/greeting|connection timeout/i.test(said) && code !== 'EDNS';
