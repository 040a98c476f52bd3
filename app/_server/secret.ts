import { createHash, timingSafeEqual } from 'node:crypto';

/** Compares two secrets without telling by its duration where they differ. */
export function sameSecret(given: string, expected: string): boolean {
  const digest = (text: string) => createHash('sha256').update(text).digest();
  return timingSafeEqual(digest(given), digest(expected));
}
