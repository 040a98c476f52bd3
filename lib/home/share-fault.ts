import { type Membership } from '@/lib/schemas/vocabulary';

type Why = 'no account' | 'wrong role' | 'already a member';

/** Why a home was not shared, and what to do. */
export function shareFault(why: Why, membership: Exclude<Membership, 'owner'>): string {
  const account = membership === 'contractor' ? 'a contractor’s account' : 'a homeowner’s account';
  if (why === 'no account') return `Nobody with this address has an account yet, or it is not confirmed. Ask them to make ${account} and to open the link that we mail them, then share again.`;
  if (why === 'wrong role') {
    return membership === 'contractor'
      ? 'This address belongs to a homeowner’s account: share as caretaker or co-owner, or ask for the address of their contractor’s account.'
      : `A ${membership} needs a homeowner’s account, and this address has another kind. Share as contractor, or ask for their other address.`;
  }
  return 'This person can see the home already. To change what they may do, end their access first, then share again.';
}
