import { type z } from 'zod';

/** How a line stands out. 'due soon' and 'overdue' carry their own colour; the words beside them say the same. */
export type Look = 'plain' | 'strong' | 'quiet' | 'due soon' | 'overdue';

export type Part =
  | { as: 'text'; text: string; look?: Look | undefined }
  /** `label` in bold, then the text. */
  | { as: 'fact'; label: string; text: string }
  | { as: 'link'; label: string; url: string; look?: 'button' | 'plain' | undefined };

/** One full-width band. */
export type Course = { title?: string | undefined; aside?: string | undefined; mark?: 'due soon' | 'overdue' | undefined; parts: Part[] };

/** What a mail says, written once; `writeHtml` and `writeText` give its two forms. */
export type Letter = { subject: string; heading: string; courses: Course[]; footer: Part[] };

export type Rendered = { subject: string; html: string; text: string };

export type MailDefinition<K extends string = string, S extends z.ZodType = z.ZodType, Q extends z.ZodType = z.ZodType> = {
  kind: K;
  /** What the mail is written from. */
  props: S;
  /** What the outbox keeps until sending, when the rest is read fresh at that moment; `props` unless given. */
  queued?: Q;
  /** The props hold a secret link: the outbox empties them once the mail is sent or given up. */
  secret?: boolean;
  write: (props: z.output<S>) => Letter;
};

/** Keeps the types of one mail kind; each file in `kinds/` exports one. */
export const defineMail = <K extends string, S extends z.ZodType, Q extends z.ZodType = S>(definition: MailDefinition<K, S, Q>) => definition;

/** One line, without control characters: fit for a subject. At most 150 characters. */
export function oneLine(text: string): string {
  const line = text.replace(/[\p{Cc}\u2028\u2029]+/gu, ' ').replace(/\s+/g, ' ').trim();
  return line.length > 150 ? `${line.slice(0, 149).trimEnd()}…` : line;
}
