import { type z } from 'zod';
import { alreadyKnownMail } from './kinds/already-known';
import { reminderMail } from './kinds/reminder';
import { resetMail } from './kinds/reset';
import { sharedMail } from './kinds/shared';
import { signInMail } from './kinds/sign-in';
import { verifyMail } from './kinds/verify';
import { type MailDefinition, oneLine, type Rendered } from './letter';
import { writeHtml } from './write-html';
import { writeText } from './write-text';

/** Every mail the application sends. A new one: a file in kinds/ and a line here. */
const definitions = {
  reminder: reminderMail,
  verify: verifyMail,
  'sign-in': signInMail,
  reset: resetMail,
  shared: sharedMail,
  'already-known': alreadyKnownMail,
};

export type MailKind = keyof typeof definitions;
type Definitions = typeof definitions;
/** What the outbox keeps of a mail until it is sent. */
export type QueuedProps<K extends MailKind> = z.input<NonNullable<Definitions[K]['queued']>>;

/** Links that somebody has asked for and waits for: they go out before the rest, and also to an address that bounced. */
export const awaitedKinds: readonly MailKind[] = ['verify', 'sign-in', 'reset', 'already-known'];
export const isAwaited = (kind: string): boolean => (awaitedKinds as readonly string[]).includes(kind);

/** Whether a link that works for some hours (`props.hours`) no longer works at `now`. */
export const hasRunOut = (props: Record<string, unknown>, createdAt: Date, now: Date): boolean =>
  typeof props.hours === 'number' && now.getTime() - createdAt.getTime() > props.hours * 3_600_000;

const definitionOf = (kind: string): MailDefinition => {
  if (!(kind in definitions)) throw new TypeError(`no such mail: ${kind}`);
  return definitions[kind as MailKind] as unknown as MailDefinition;
};

export const isSecret = (kind: string): boolean => definitionOf(kind).secret === true;

/** Throws a ZodError when the props are not what the mail's kind asks for. */
export const checkQueuedProps = (kind: string, props: unknown): Record<string, unknown> => {
  const definition = definitionOf(kind);
  return (definition.queued ?? definition.props).parse(props) as Record<string, unknown>;
};

/** Subject, HTML and plain text of a mail. Throws when the props do not fit its kind. */
export function renderMail(kind: string, props: unknown): Rendered {
  const definition = definitionOf(kind);
  const letter = definition.write(definition.props.parse(props));
  return { subject: oneLine(letter.subject), html: writeHtml(letter), text: writeText(letter) };
}
