import 'server-only';
import { hash, verify } from '@node-rs/argon2';

/** Argon2id with the parameters of the OWASP password storage cheat sheet: 19 MiB, two passes, one lane. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** One spelling for letters that keyboards compose differently (NIST SP 800-63B asks for this before hashing). */
const oneSpelling = (password: string) => password.normalize('NFKC');

export const hashPassword = (password: string): Promise<string> => hash(oneSpelling(password), cost);

let decoy: Promise<string> | undefined;

/** False for a wrong password or an account without one; takes as long either way. */
export async function passwordMatches(password: string, passwordHash: string | null | undefined): Promise<boolean> {
  decoy ??= hashPassword('nobody has this password');
  const matches = await verify(passwordHash ?? (await decoy), oneSpelling(password));
  return matches && typeof passwordHash === 'string';
}
