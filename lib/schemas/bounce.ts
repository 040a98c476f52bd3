import { z } from 'zod';
import { statusCodeOf } from '../mail/delivery-status';
import { type BounceReport } from '../mail/bounce-rules';

const short = z.string().trim().min(1).max(500);

/** A bounce as an adapter of a mail provider's notices sends it. */
export const bounceJson = z
  .object({
    id: short,
    messageId: short.nullish(),
    address: z.string().trim().toLowerCase().pipe(z.email()).nullish(),
    permanent: z.boolean(),
    status: short.nullish(),
    detail: z.string().trim().max(5000).nullish(),
  })
  .refine(({ messageId, address }) => Boolean(messageId ?? address), { path: ['address'], error: 'Say which mail (messageId) or which address it was.' })
  .transform(
    ({ id, messageId, address, permanent, status, detail }): BounceReport => ({
      key: `id:${id}`,
      messageId: messageId ? `<${messageId.replace(/^<|>$/g, '')}>` : null,
      address: address ?? null,
      permanent,
      status: statusCodeOf(status ?? undefined),
      detail: detail?.slice(0, 500) || null,
    }),
  );
