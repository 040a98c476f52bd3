import { z } from 'zod';
import { choice } from '@/lib/schemas/measures';
import { homeTarget } from '@/lib/schemas/targets';
import { keysOf, workKinds } from '@/lib/schemas/vocabulary';

/** Which work is put off, or taken up again: one kind on some walls of a home. */
export const putOffSchema = homeTarget.extend({
  kind: choice(keysOf(workKinds), 'which work'),
  wallIds: z.array(z.string().min(1).max(60), { error: 'Choose at least one wall.' }).min(1, 'Choose at least one wall.').max(60),
});
