import { defineHandler } from '@/app/_server/handler';
import { problem } from '@/app/_server/problem';
import { retryMail } from '@/db/queries/mail-view';
import { deliverMail } from '@/jobs/deliver';

export const POST = defineHandler({
  verb: 'mail.retry',
  run: async ({ actor, params }) => {
    const id = params.id ?? '';
    const answer = retryMail(actor, id, new Date());
    if (!answer.retried) return problem(409, 'Not retried', answer.why);
    return { state: await deliverMail(id) };
  },
});
