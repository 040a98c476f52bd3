import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { keepMessage, startMailbox } from '@/jobs/mailbox';
import { listMessages, readMessage } from '@/jobs/mailbox-read';
import { smtpTransport } from '@/jobs/transport';

let folder = '';
beforeEach(() => void (folder = mkdtempSync(path.join(tmpdir(), 'eavewright-mailbox-'))));
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const letter = (subject: string) => ({
  from: '"Eavewright" <reminders@eavewright.example>',
  to: { name: '', address: 'ada@example.test' },
  subject,
  html: '<p>Grüße</p>',
  text: 'Grüße\n.\nafter a line with one dot',
  messageId: '<m1@eavewright.example>',
  headers: { 'Auto-Submitted': 'auto-generated' },
});

describe('the local mail fake', () => {
  it('keeps each message as one file and reads it back as it was sent', async () => {
    const { port, stop } = await startMailbox({ host: '127.0.0.1', port: 0, folder });
    const transport = smtpTransport(`smtp://127.0.0.1:${port}`);
    await transport.sendMail(letter('First: Überfällig'));
    await transport.sendMail(letter('Second'));
    await stop();
    expect(readdirSync(folder).every((name) => name.endsWith('.eml') && !name.startsWith('.'))).toBe(true);
    const { total, messages } = await listMessages(folder, 0, 10);
    expect([total, messages.map((one) => one.subject)]).toEqual([2, ['Second', 'First: Überfällig']]);
    const message = await readMessage(folder, messages[1]?.name ?? '');
    expect(message).toMatchObject({ subject: 'First: Überfällig', to: 'ada@example.test', messageId: '<m1@eavewright.example>' });
    expect(message?.html?.trim()).toBe('<p>Grüße</p>');
    expect(message?.text.trim()).toBe('Grüße\n.\nafter a line with one dot');
    expect(message?.headers).toContainEqual({ name: 'Auto-Submitted', value: 'auto-generated' });
  });

  it('listens on this machine only', () => {
    expect(() => startMailbox({ host: '0.0.0.0', port: 0, folder })).toThrow('this machine only');
    expect(() => startMailbox({ host: 'mail.example.org', port: 0, folder })).toThrow('this machine only');
  });

  it('says so when its port is taken', async () => {
    const { port, stop } = await startMailbox({ host: '127.0.0.1', port: 0, folder });
    await expect(startMailbox({ host: '127.0.0.1', port, folder })).rejects.toThrow('EADDRINUSE');
    await stop();
  });

  it('names messages so that they sort by time, in pages newest first', async () => {
    const days = ['2027-05-15T15:00:00.001Z', '2027-05-15T15:00:00.000Z', '2027-12-01T00:00:00.000Z', '2027-05-15T15:00:00.000Z'];
    for (const [i, day] of days.entries()) keepMessage(folder, Buffer.from(`Subject: ${i}\r\n\r\nbody`), new Date(day));
    const subjects = async (skip: number) => (await listMessages(folder, skip, 2)).messages.map((one) => one.subject);
    expect([...(await subjects(0)), ...(await subjects(2))]).toEqual(['2', '0', '3', '1']);
    expect(await subjects(4)).toEqual([]);
  });

  it('reads no file outside its folder and nothing that is not a message', async () => {
    writeFileSync(path.join(folder, 'secret.txt'), 'Subject: no\r\n\r\n');
    writeFileSync(path.join(folder, '.half.eml.part'), 'Subject: half');
    const outside = path.join(folder, '..', 'outside.eml');
    writeFileSync(outside, 'Subject: no\r\n\r\n');
    const names = ['../outside.eml', '..%2Foutside.eml', '/etc/passwd', 'secret.txt', '.half.eml.part', 'a/../../outside.eml', 'none.eml', '', '..'];
    for (const name of names) expect(await readMessage(folder, name)).toBeNull();
    rmSync(outside);
    expect((await listMessages(folder, 0, 10)).total).toBe(0);
    expect((await listMessages(path.join(folder, 'not there'), 0, 10)).total).toBe(0);
  });
});
