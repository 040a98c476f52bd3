import { defineHandler } from '@/app/_server/handler';
import { sealantSchema } from '@/lib/schemas/sealant';
import { sealantAnswer } from '@/lib/takeoff/sealant-need';

/** How much caulk and backer rod for the joints of some walls. Open to anybody; nothing is kept. */
export const POST = defineHandler({
  verb: 'anyone',
  schema: sealantSchema,
  run: ({ input }) => sealantAnswer(input),
});
