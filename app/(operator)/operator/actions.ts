'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { defineAction } from '@/app/_server/action';
import { sendAgain } from '@/db/queries/bounces';
import { runReminders } from '@/jobs/reminders';

/** The same run that the scheduler makes every hour; running it twice sends nothing twice. */
export const runRemindersNow = defineAction({
  verb: 'mail.retry',
  schema: z.object({}),
  run: () => null,
  after: async () => {
    await runReminders(new Date());
    revalidatePath('/operator', 'layout');
  },
});

/** The operator has reason to think that mail reaches the person's address again. */
export const sendToAddressAgain = defineAction({
  verb: 'mail.retry',
  schema: z.object({ userId: z.string().min(1) }),
  run: (actor, { userId }) => sendAgain(actor, userId),
  after: () => revalidatePath('/operator', 'layout'),
});
