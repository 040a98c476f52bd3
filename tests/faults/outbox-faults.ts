import { type HarshSmtp } from '@/tests/fixtures/harsh-smtp';
import { childRun } from './children';
import { homesDue, minutes, type Outcome, outcomeOf, settle, start } from './outbox-scene';

export type Size = { mails: number; kills: number; slowMs: number; slowMails: number; largestFilesKb: number[]; downTurns: number };
export const fullSize: Size = { mails: 1000, kills: 100, slowMs: 2000, slowMails: 40, largestFilesKb: [40, 160, 640, 1600], downTurns: 6 };
export const shortSize: Size = { mails: 40, kills: 4, slowMs: 50, slowMails: 12, largestFilesKb: [160], downTurns: 1 };

/** A fault on a fresh database and a fresh mail server whose address is in SMTP_URL. */
export type OutboxFault = { name: string; duplicatesAllowed: boolean; run: (smtp: HarshSmtp, size: Size) => Promise<Outcome> };

const numberIn = (address: string) => Number(/\d+/.exec(address)?.[0] ?? -1);
const together = (n: number, at: Date) => Promise.all(Array.from({ length: n }, () => childRun({ at })));
const every = (n: number) => (address: string) => address !== '' && numberIn(address) % n === 0;

const fault = (name: string, cause: (smtp: HarshSmtp, size: Size) => Promise<Date | void>, options: { duplicatesAllowed?: boolean; mails?: (size: Size) => number; refused?: (address: string) => boolean } = {}): OutboxFault => ({
  name,
  duplicatesAllowed: options.duplicatesAllowed ?? false,
  run: async (smtp, size) => {
    const mails = options.mails?.(size) ?? size.mails;
    homesDue(mails);
    const until = (await cause(smtp, size)) ?? start;
    await settle(smtp, until);
    return outcomeOf(name, mails, smtp, options.refused);
  },
});

const kills = fault(
  'killed at random moments (SIGKILL), started again',
  async (_smtp, { kills: n }) => {
    // Six minutes apart, so that what a dead run held is free again.
    const usual = process.env.MAIL_PER_SECOND;
    process.env.MAIL_PER_SECOND = '60';
    for (let i = 0; i < n; i += 1) await childRun({ at: minutes(6 * i), killAfterMs: Math.random() * 400 });
    process.env.MAIL_PER_SECOND = usual;
    return minutes(6 * n);
  },
  { duplicatesAllowed: true },
);

const atOnce = [2, 4].map((n) => fault(`${n} runs at once`, async () => void (await together(n, start))));

const down = fault('mail server down', async (smtp, { downTurns }) => {
  const up = process.env.SMTP_URL;
  process.env.SMTP_URL = 'smtp://127.0.0.1:1';
  for (let i = 0; i < downTurns; i += 1) await childRun({ at: minutes(2 * i) });
  process.env.SMTP_URL = up ?? smtp.url;
  return minutes(60);
});

const slow = fault(
  'mail server slow, two runs at once',
  async (smtp, { slowMs }) => {
    smtp.slow(slowMs);
    await together(2, start);
  },
  { mails: (size) => size.slowMails },
);

const refusals = (['MAIL', 'RCPT', 'DATA'] as const).flatMap((at) => [
  fault(`4xx at ${at}`, (smtp) => {
    smtp.treat((address, tries) => (at === 'MAIL' ? (address === '' && tries <= 5 ? { at, code: 451 } : 'take') : every(3)(address) && tries <= 2 ? { at, code: 451 } : 'take'));
    return Promise.resolve();
  }),
  at === 'MAIL'
    ? fault('5xx at MAIL (our own sender)', (smtp) => {
        smtp.treat((address, tries) => (address === '' && tries <= 5 ? { at, code: 550 } : 'take'));
        return Promise.resolve();
      })
    : fault(
        `5xx at ${at}`,
        (smtp) => {
          smtp.treat((address) => (every(10)(address) ? { at, code: 550 } : 'take'));
          return Promise.resolve();
        },
        { refused: every(10) },
      ),
]);

const cut = fault(
  'line cut after DATA, before the answer',
  (smtp) => {
    smtp.treat((address, tries) => (every(7)(address) && tries === 1 ? 'cut' : 'take'));
    return Promise.resolve();
  },
  { duplicatesAllowed: true },
);

const reset = fault('line reset after it was accepted', (smtp) => {
  smtp.treat((address, tries) => (address === '' ? (tries <= 3 ? 'reset' : 'take') : every(7)(address) && tries === 1 ? 'reset' : 'take'));
  return Promise.resolve();
});

const diskFull = fault(
  'disk full during a run',
  async (_smtp, { largestFilesKb }) => {
    // The write-ahead log cannot grow beyond this: from some moment on nothing can be written.
    for (const [i, largestFileKb] of largestFilesKb.entries()) await childRun({ at: minutes(6 * i), largestFileKb });
    return minutes(6 * largestFilesKb.length);
  },
  { duplicatesAllowed: true },
);

const jumps = [60, 24 * 60].flatMap((back) => [
  fault(
    `clock set back ${back / 60} h between runs`,
    async (smtp) => {
      smtp.treat((address, tries) => (every(2)(address) && tries === 1 ? { at: 'RCPT', code: 451 } : 'take'));
      await childRun({ at: minutes(2 * back), killAfterMs: 200 });
      await childRun({ at: minutes(back) });
      return minutes(back + 6);
    },
    { duplicatesAllowed: true },
  ),
  fault(`clock set back ${back / 60} h during a run`, async () => void (await childRun({ at: start, jumpMs: -back * 60_000 }))),
]);

/** Midnight to nine in New York, on the nights on which the clocks go forward and back in 2027, every half hour. */
const nights = ['2027-03-14', '2027-11-07'].map((day): OutboxFault => {
  const name = `daylight-saving night ${day}`;
  return {
    name,
    duplicatesAllowed: false,
    run: async (smtp, { mails }) => {
      homesDue(mails, { timeZone: 'America/New_York', remindOn: day });
      for (let i = 0; i < 20; i += 1) await settle(smtp, minutes(30 * i, new Date(`${day}T04:00:00Z`)));
      return outcomeOf(name, mails, smtp);
    },
  };
});

export const outboxFaults: OutboxFault[] = [kills, ...atOnce, down, slow, ...refusals, cut, reset, diskFull, ...jumps, ...nights];

/** One of each sort, for every run of the tests; all of them: npm run test:faults. */
export const shortFaults: OutboxFault[] = outboxFaults.filter(({ name }) => /^killed|^2 runs|^mail server down|^5xx at RCPT|^line cut|03-14$/.test(name));
