'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { defineAction } from '@/app/_server/action';
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
