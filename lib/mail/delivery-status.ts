/**
 * Reads the machine-readable part of a delivery status message (RFC 3464 §2): groups of fields set apart by blank lines, the
 * first about the message, each further one about one recipient. Lines that begin with a space go on from the line before.
 */
export type RecipientStatus = { address: string; action: 'failed' | 'delayed' | 'delivered' | 'relayed' | 'expanded'; status: string | null; detail: string | null };

const actions = ['failed', 'delayed', 'delivered', 'relayed', 'expanded'] as const;

/** What stands after the type, as in `rfc822; ada@example.test` (RFC 3464 §2.1.2), without comments and angle brackets. */
const afterType = (value: string): string => value.slice(value.indexOf(';') + 1).trim();
const bare = (address: string): string => address.replace(/^<(.*)>$/, '$1').trim().toLowerCase();

function fieldsOf(group: string): Map<string, string> {
  const unfolded = group.replace(/\n[ \t]+/g, ' ');
  const fields = unfolded.split('\n').flatMap((line): [string, string][] => {
    const colon = line.indexOf(':');
    return colon > 0 ? [[line.slice(0, colon).trim().toLowerCase(), line.slice(colon + 1).trim()]] : [];
  });
  return new Map(fields);
}

/** Enhanced status code: class 2, 4 or 5, subject, detail (RFC 3463 §2). Worked example: "5.1.1 (no such user)" → "5.1.1". */
export const statusCodeOf = (value: string | undefined): string | null => /^\s*([245]\.\d{1,3}\.\d{1,3})(?!\d)/.exec(value ?? '')?.[1] ?? null;

/** One entry for each recipient group that names an address and an action; anything else is passed over. */
export function readDeliveryStatus(text: string): RecipientStatus[] {
  const groups = text.replace(/\r\n?/g, '\n').split(/\n[ \t]*\n/);
  return groups.flatMap((group): RecipientStatus[] => {
    const fields = fieldsOf(group);
    const address = bare(afterType(fields.get('original-recipient') ?? fields.get('final-recipient') ?? ''));
    const said = (fields.get('action') ?? '').toLowerCase();
    const action = actions.find((one) => said === one || said.startsWith(`${one} `));
    if (!address || !fields.has('final-recipient') || !action) return [];
    const diagnostic = fields.get('diagnostic-code');
    return [{ address, action, status: statusCodeOf(fields.get('status')), detail: diagnostic ? afterType(diagnostic).slice(0, 500) : null }];
  });
}

/**
 * Whether a failure is for good: the class of the status code says so (RFC 3463 §3.1: 5 permanent, 4 persistent transient);
 * without a code, a failed action is for good (RFC 3464 §2.3.3). A full mailbox (x.2.2) and trouble on the way (x.4.x) are
 * taken as passing even when they come as 5 (our rule).
 */
export function isPermanent({ action, status }: Pick<RecipientStatus, 'action' | 'status'>): boolean {
  if (action !== 'failed') return false;
  if (status === null) return true;
  return status.startsWith('5.') && !/^5\.(2\.2|4\.\d+)$/.test(status);
}
