import { type WorkKind } from '@/lib/schemas/vocabulary';

/** Addresses that mails lead to. `site` is the public address of the application. */
export const planUrl = (site: string, homeId: string): string => new URL(`/homes/${homeId}`, site).href;

export const accountUrl = (site: string): string => new URL('/account', site).href;

/** The form for logging work, with kind and wall filled in. */
export function logUrl(site: string, homeId: string, kind: WorkKind, wallId: string): string {
  const url = new URL(`/homes/${homeId}/log`, site);
  url.searchParams.set('kind', kind);
  url.searchParams.set('wall', wallId);
  return url.href;
}
