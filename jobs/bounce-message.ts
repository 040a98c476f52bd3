import { createHash } from 'node:crypto';
import { simpleParser } from 'mailparser';
import { type BounceReport } from '@/lib/mail/bounce-rules';
import { isPermanent, readDeliveryStatus } from '@/lib/mail/delivery-status';

/** The reports in a delivery status message (RFC 3464), one for each recipient that failed or is delayed; null when it is none. */
export async function readBounceMessage(raw: string): Promise<BounceReport[] | null> {
  const message = await simpleParser(raw, { keepDeliveryStatus: true, skipTextToHtml: true, skipImageLinks: true });
  const part = (...types: string[]) => message.attachments.find((one) => types.includes(one.contentType.toLowerCase()))?.content.toString('utf8');
  const notice = part('message/delivery-status', 'message/global-delivery-status');
  if (notice === undefined) return null;
  const returned = part('message/rfc822', 'text/rfc822-headers', 'message/global', 'message/global-headers');
  const messageId = returned ? ((await simpleParser(returned)).messageId ?? null) : null;
  const name = message.messageId ?? createHash('sha256').update(raw).digest('hex');
  return readDeliveryStatus(notice)
    .filter(({ action }) => action === 'failed' || action === 'delayed')
    .map((one) => ({ key: `dsn:${name}:${one.address}`, messageId, address: one.address, permanent: isPermanent(one), status: one.status, detail: one.detail }));
}
