import { defineHandler } from '@/app/_server/handler';
import { problem } from '@/app/_server/problem';
import { recordBounce } from '@/db/queries/bounces';
import { readBounceMessage } from '@/jobs/bounce-message';
import { bounceJson } from '@/lib/schemas/bounce';
import { z } from 'zod';

/** What a mail provider or a mailbox for returns tells us: JSON, or the delivery status message itself (RFC 3464). */
export const POST = defineHandler({
  verb: 'bounces',
  reads: 'json or text',
  schema: z.union([z.string(), bounceJson]),
  run: async ({ input }) => {
    const reports = typeof input === 'string' ? await readBounceMessage(input) : [input];
    if (reports === null) return problem(422, 'Not a delivery status message', 'No part of type message/delivery-status was found in it.');
    return { outcomes: reports.map((report) => recordBounce(report, new Date())) };
  },
});
