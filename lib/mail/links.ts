import { type Membership } from '@/lib/schemas/vocabulary';

/** Addresses that mails lead to. `site` is the public address of the application. */
export const planUrl = (site: string, homeId: string): string => new URL(`/homes/${homeId}`, site).href;

export const accountUrl = (site: string): string => new URL('/account', site).href;

/** Where a person sees a home that was shared with them: contractors have pages of their own. */
export const sharedUrl = (site: string, homeId: string, membership: Membership): string => new URL(membership === 'contractor' ? `/work/${homeId}` : `/homes/${homeId}`, site).href;

/** Does one thing about one piece of work, without sign-in; `token` is signed. */
export const doUrl = (site: string, token: string): string => new URL(`/do/${token}`, site).href;

/** Where mail programs send the one click of RFC 8058; opened by hand it shows a page that asks first. */
export const unsubscribeUrl = (site: string, token: string): string => new URL(`/api/mail/unsubscribe/${token}`, site).href;
