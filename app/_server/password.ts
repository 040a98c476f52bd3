import 'server-only';
import { hash, verify } from '@node-rs/argon2';

/** Argon2id with the parameters of the OWASP password storage cheat sheet: 19 MiB, two passes, one lane. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, cost);

let decoy: Promise<string> | undefined;

/** False for a wrong password or an account without one; takes as long either way. */
export async function passwordMatches(password: string, passwordHash: string | null | undefined): Promise<boolean> {
  decoy ??= hashPassword('nobody has this password');
  const matches = await verify(passwordHash ?? (await decoy), password);
  return matches && typeof passwordHash === 'string';
}
