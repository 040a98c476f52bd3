'use server';

import { z } from 'zod';
import { defineAction, FieldFault } from '@/app/_server/action';
import { mailLinkOf, submissionKeyOf } from '@/app/_server/mail-link';
import { isPutOff, stopWork, workToDo } from '@/db/queries/linked-work';
import { type MailLink } from '@/db/queries/mail-links';
import { putOffWork } from '@/db/queries/put-off';
import { stopHome } from '@/db/queries/reminder-stops';
import { changeHome } from '@/db/queries/replan';
import { isLogged, logWork } from '@/db/queries/work';
import { isCalendarDay } from '@/lib/calendar';
import { dayNotYet } from '@/lib/home/not-yet';

const schema = z.object({
  token: z.string().min(1).max(2000),
  doneOn: z.string().trim().refine(isCalendarDay, 'Say which day, like 2026-06-15.').optional(),
});

/** Does what a link from a mail says, once. The token is the authority; the person's rights are those of today. */
export const doIt = defineAction({
  verb: 'anyone',
  schema,
  prepare: ({ token }) => mailLinkOf(token, new Date()),
  run: (_, { token, doneOn }, prepared) => {
    if (typeof prepared === 'string') return new FieldFault({ '': prepared });
    const link = prepared as MailLink;
    const now = new Date();
    if (link.action === 'stop home') return void stopHome(link.userId, link.homeId, now);
    const submissionKey = submissionKeyOf(token);
    if (link.action === 'log' && isLogged(submissionKey, link.userId)) return;
    if (link.action === 'put off' && isPutOff(link)) return;
    const work = workToDo(link, now);
    const { actor, homeId, item, today } = work;
    const day = doneOn ?? today;
    if (link.action === 'stop') return stopWork(work);
    if (link.action === 'put off') return void changeHome(homeId, now, () => putOffWork(actor, homeId, item.kind, [item.wallId], now));
    if (day > today) return new FieldFault({ doneOn: dayNotYet(day, today) });
    return void changeHome(homeId, now, () => logWork(actor, { homeId, submissionKey, kind: item.kind, doneOn: day, wallIds: [item.wallId] }));
  },
});
