import 'server-only';
import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';

/** Ten tries in a quarter of an hour, by account and by address of the sender (more of those: a household shares one). Our rule. */
const holder = globalThis as typeof globalThis & { eavewrightAttempts?: { account: RateLimiterMemory; sender: RateLimiterMemory } };
const limits = () =>
  (holder.eavewrightAttempts ??= {
    account: new RateLimiterMemory({ points: 10, duration: 900 }),
    sender: new RateLimiterMemory({ points: 60, duration: 900 }),
  });

/** Minutes to wait before the next try, or 0 after counting this one. */
export async function countAttempt(account: string, sender: string): Promise<number> {
  try {
    await limits().sender.consume(sender);
    await limits().account.consume(account);
    return 0;
  } catch (refusal) {
    if (refusal instanceof RateLimiterRes) return Math.max(1, Math.ceil(refusal.msBeforeNext / 60_000));
    throw refusal;
  }
}

export const forgetAttempts = (account: string): Promise<boolean> => limits().account.delete(account);
