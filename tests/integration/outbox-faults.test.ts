import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { shortFaults, shortSize } from '@/tests/faults/outbox-faults';
import { setEnvironment } from '@/tests/fixtures/environment';
import { type HarshSmtp, startHarshSmtp } from '@/tests/fixtures/harsh-smtp';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

setEnvironment({ MAIL_PER_SECOND: '1000' });
useFreshDatabase();

let smtp: HarshSmtp;
beforeEach(async () => {
  smtp = await startHarshSmtp();
  process.env.SMTP_URL = smtp.url;
});
afterEach(() => smtp.stop());

/** The full versions: npm run test:faults. */
describe('no mail is lost, and none comes twice that could have been told apart', () => {
  it.each(shortFaults)('$name', async ({ run, duplicatesAllowed }) => {
    const { lost, strange, duplicates, sent, refused, mails } = await run(smtp, shortSize);
    expect({ lost, strange, ended: sent + refused }).toEqual({ lost: 0, strange: [], ended: mails });
    if (!duplicatesAllowed) expect(duplicates).toBe(0);
  });
});
