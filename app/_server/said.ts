import 'server-only';
import { cookies } from 'next/headers';
import { saidCookie } from '@/lib/said';

/** Leaves a sentence for the page that the browser is sent to next. It is shown once. */
export async function say(words: string): Promise<void> {
  (await cookies()).set(saidCookie, words.slice(0, 1500), { path: '/', maxAge: 30, sameSite: 'lax' });
}

export async function whatWasSaid(): Promise<string | null> {
  return (await cookies()).get(saidCookie)?.value ?? null;
}
