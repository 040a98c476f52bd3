import { defineHandler } from '@/app/_server/handler';
import { runReminders } from '@/jobs/reminders';

export const POST = defineHandler({ verb: 'cron', run: () => runReminders(new Date()) });
