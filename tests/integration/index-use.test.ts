import { describe, expect, it } from 'vitest';
import { dueMails } from '@/db/queries/mail';
import { itemsNearlyDue } from '@/db/queries/reminders';
import { nearlyLapsed } from '@/db/queries/replan';
import { setEnvironment } from '@/tests/fixtures/environment';
import { planOf } from '@/tests/fixtures/query-plan';
import { useFreshDatabase } from '@/tests/setup/fresh-database';

setEnvironment();
useFreshDatabase();

const now = new Date('2027-05-15T18:00:00Z');

describe('what every run asks', () => {
  it.each([
    ['homes to remind', () => planOf(itemsNearlyDue(now)), /^SEARCH work_item USING INDEX work_item_remind/],
    ['homes to plan anew', () => planOf(nearlyLapsed(now)), /^SEARCH home USING INDEX home_replan/],
    ['mails to send', () => planOf(dueMails(now, 100)), /^SEARCH mail USING INDEX mail_open/],
  ])('%s are found by an index: the cost follows what is due', (_what, steps, index) => {
    expect(steps()).toContainEqual(expect.stringMatching(index));
    expect(steps().filter((step) => step.startsWith('SCAN'))).toEqual([]);
  });
});
