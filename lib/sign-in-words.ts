/** What a code of the sign-in routes means, in words; next-auth names some of the codes, we the others. */
const words: Record<string, string> = {
  wrong: 'This e-mail address and password do not go together.',
  CredentialsSignin: 'This e-mail address and password do not go together.',
  Address: 'This is not an e-mail address. It looks like name@example.com.',
  AccessDenied: 'Too many links were asked for. Wait a quarter of an hour, or use your password.',
  Verification: 'This link was used already, or it is older than two hours. Ask for a new one.',
  EmailSignin: 'The link could not be sent just now. Try again in a few minutes, or use your password.',
  EmailCreateAccount: 'The account could not be made just now. Nothing is lost: ask for a new link in a few minutes.',
  SessionRequired: 'Sign in to go on to that page.',
  Configuration: 'Something is wrong on our side. Nothing of yours is lost; try again later.',
  Unreachable: 'Eavewright did not answer as it should. Nothing is lost: try again in a minute.',
};

const otherwise = 'Signing in did not work just now. Nothing of yours is lost: try once more.';

/** `wait:7` says that seven minutes have to pass. */
export function signInFault(code: string): string {
  const minutes = /^wait:(\d+)$/.exec(code)?.[1];
  if (minutes) return `Too many tries. Wait ${minutes === '1' ? 'a minute' : `${minutes} minutes`}, or ask for a sign-in link.`;
  return Object.hasOwn(words, code) ? (words[code] ?? otherwise) : otherwise;
}
