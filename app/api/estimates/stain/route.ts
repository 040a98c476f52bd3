import { defineHandler } from '@/app/_server/handler';
import { estimateSchema } from '@/lib/schemas/estimate';
import { stainAnswer } from '@/lib/takeoff/estimate';

/** How much stain for some walls. Open to anybody; nothing is kept. */
export const POST = defineHandler({
  verb: 'anyone',
  schema: estimateSchema,
  run: ({ input }) => stainAnswer(input),
});
