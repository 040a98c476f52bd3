type Answer = { url?: string };

/** Posts to one of next-auth's routes: where it leads, or null when the answer makes no sense. A lost connection throws TypeError, as fetch does. */
async function post(route: string, values: Record<string, string>): Promise<URL | null> {
  const csrf = await fetch('/api/auth/csrf', { cache: 'no-store' });
  if (!csrf.ok) return null;
  const { csrfToken } = (await csrf.json()) as { csrfToken: string };
  const response = await fetch(`/api/auth/${route}`, { method: 'POST', body: new URLSearchParams({ ...values, csrfToken, json: 'true' }) });
  const { url } = (await response.json().catch(() => ({}))) as Answer;
  return url ? new URL(url, window.location.origin) : null;
}

/** The code of what went wrong, or null. */
const faultOf = (to: URL | null): string | null => (to ? to.searchParams.get('error') : 'Unreachable');

type Credentials = { email: string; password: string; callbackUrl?: string };

export const postPassword = async (values: Credentials): Promise<string | null> => faultOf(await post('callback/credentials', { callbackUrl: '/start', ...values }));
export const askForLink = async (values: { email: string; callbackUrl: string }): Promise<string | null> => faultOf(await post('signin/email', values));
/** Where to go, signed out; null when it did not work. */
export const postSignOut = async (): Promise<string | null> => (await post('signout', { callbackUrl: '/sign-in?said=signed-out' }))?.href ?? null;
