import 'server-only';
import { headers } from 'next/headers';
import { RateLimiterMemory } from 'rate-limiter-flexible';

const quarterHour = 900;
const limiter = (points: number) => new RateLimiterMemory({ points, duration: quarterHour });

/**
 * In a quarter of an hour: ten failed tries for one account and sixty from one sender (a phone network shares one address among many);
 * five mails asked for to one address and thirty by one sender. Our rule.
 */
const makeLimits = () => ({ tries: { subject: limiter(10), sender: limiter(60) }, mails: { subject: limiter(5), sender: limiter(30) } });
type Limits = ReturnType<typeof makeLimits>;
type Pair = Limits[keyof Limits];

const holder = globalThis as typeof globalThis & { eavewrightLimits?: Limits };
const limits = () => (holder.eavewrightLimits ??= makeLimits());

/** The address that the nearest proxy saw: the last of the list, as whoever sends can write the ones before. */
export const senderIn = (list: string | null | undefined): string => list?.split(',').at(-1)?.trim() || 'local';

export const currentSender = async (): Promise<string> => senderIn((await headers()).get('x-forwarded-for'));

const isRefusal = (thrown: unknown): thrown is { msBeforeNext: number } => typeof thrown === 'object' && thrown !== null && 'msBeforeNext' in thrown;

async function count(pair: Pair, subject: string, sender: string): Promise<number> {
  try {
    await pair.sender.consume(sender);
    await pair.subject.consume(subject);
    return 0;
  } catch (refusal) {
    // The refusal is no Error; its class may be loaded twice in a bundle, so it is told by its field.
    if (!isRefusal(refusal)) throw refusal;
    return Math.max(1, Math.ceil(refusal.msBeforeNext / 60_000));
  }
}

/** Counts a try before it is judged, so that many at once cannot slip through. Minutes to wait, or 0. */
export const startTry = (subject: string, sender: string): Promise<number> => count(limits().tries, subject, sender);

/** It was right: only failures count. */
export async function tryWorked(subject: string, sender: string): Promise<void> {
  await limits().tries.sender.reward(sender);
  await limits().tries.subject.delete(subject);
}

/** Counts a mail that somebody asks for without being signed in. Minutes to wait, or 0. */
export const startMail = (toAddress: string, sender: string): Promise<number> => count(limits().mails, toAddress, sender);

export const waitWords = (minutes: number): string => `Too many tries. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`}, then try again.`;
