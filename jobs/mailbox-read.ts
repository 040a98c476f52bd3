import { open, readdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import { type AddressObject, simpleParser } from 'mailparser';
import { environment } from './environment';

export type MessageSummary = { name: string; to: string; subject: string; date: Date | null };
export type Message = MessageSummary & { from: string; messageId: string; headers: { name: string; value: string }[]; html: string | null; text: string };

const nameOfMessage = /^[0-9A-Za-z-]+\.eml$/;
const headerBytes = 16_384;

/** The folder of the mail fake, or null when the application runs without one. */
export function mailboxFolder(): string | null {
  const folder = environment().MAILBOX_DIR;
  return folder ? path.resolve(/* turbopackIgnore: true */ process.cwd(), folder) : null;
}

const addresses = (of: AddressObject | AddressObject[] | undefined) => (Array.isArray(of) ? of : of ? [of] : []).map((one) => one.text).join(', ');

/** Messages newest first; only the page's headers are read. */
export async function listMessages(folder: string, skip: number, take: number): Promise<{ total: number; messages: MessageSummary[] }> {
  const names = (await readdir(folder).catch(missingIsEmpty)).filter((name) => nameOfMessage.test(name)).sort().reverse();
  const messages = await Promise.all(names.slice(skip, skip + take).map((name) => summary(folder, name)));
  return { total: names.length, messages };
}

async function summary(folder: string, name: string): Promise<MessageSummary> {
  const file = await open(path.join(folder, name));
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(headerBytes), 0, headerBytes, 0);
    const head = buffer.subarray(0, bytesRead);
    const end = head.indexOf('\r\n\r\n');
    const parsed = await simpleParser(end < 0 ? head : head.subarray(0, end + 4));
    return { name, to: addresses(parsed.to), subject: parsed.subject ?? '', date: parsed.date ?? null };
  } finally {
    await file.close();
  }
}

/** One message, or null when no message has this name. A name is never a path. */
export async function readMessage(folder: string, name: string): Promise<Message | null> {
  if (!nameOfMessage.test(name)) return null;
  const raw = await readFile(path.join(folder, name)).catch(missingIsEmpty);
  if (Array.isArray(raw)) return null;
  const parsed = await simpleParser(raw, { skipTextToHtml: true });
  return {
    name,
    from: addresses(parsed.from),
    to: addresses(parsed.to),
    subject: parsed.subject ?? '',
    date: parsed.date ?? null,
    messageId: parsed.messageId ?? '',
    headers: parsed.headerLines.map(({ key, line }) => ({ name: line.slice(0, key.length), value: line.slice(line.indexOf(':') + 1).trim() })),
    html: parsed.html || null,
    text: parsed.text ?? '',
  };
}

function missingIsEmpty(error: NodeJS.ErrnoException): never[] {
  if (error.code === 'ENOENT') return [];
  throw error;
}
