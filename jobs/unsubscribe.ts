import { signLink } from '@/db/queries/mail-links';
import { type MailRow } from '@/db/queries/mail';
import { unsubscribeUrl } from '@/lib/mail/links';

/** The headers of a reminder that let a mail program stop further ones with one click (RFC 2369 §3.2, RFC 8058 §3.1). None for other mails. */
export function unsubscribeHeaders({ kind, userId, homeId }: Pick<MailRow, 'kind' | 'userId' | 'homeId'>, site: string): Record<string, string> {
  if (kind !== 'reminder' || !userId || !homeId) return {};
  const token = signLink({ action: 'stop home', userId, homeId, workKey: '', expiresAt: null });
  return { 'List-Unsubscribe': `<${unsubscribeUrl(site, token)}>`, 'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click' };
}
