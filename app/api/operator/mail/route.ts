import { defineHandler } from '@/app/_server/handler';
import { outboxPage } from '@/app/_server/outbox';
import { outboxQuery } from '@/lib/schemas/outbox';

export const GET = defineHandler({ verb: 'mail.view', schema: outboxQuery, run: ({ actor, input }) => outboxPage(actor, input) });
