/** So many passing bounces within so many days count as one for good. Our rule. */
export const temporaryBounces = { most: 5, withinDays: 14 };

/** What came back: of a mail (by its Message-ID), of an address, or both. `key` names the report; the same key again is the same report. */
export type BounceReport = { key: string; messageId: string | null; address: string | null; permanent: boolean; status: string | null; detail: string | null };
