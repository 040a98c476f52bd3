import 'server-only';
import { type ReactNode } from 'react';
import { sendVerifyAgain } from '@/app/(account)/account/actions';
import { ConfirmBand } from '@/components/account/confirm-band';
import { SignOutButton } from '@/components/account/sign-out-button';
import { SiteFooter } from '@/components/ui/site-footer';
import { SiteHeader } from '@/components/ui/site-header';
import { hasConfirmedAddress } from '@/db/queries/people';
import { type Role } from '@/lib/schemas/vocabulary';
import { homePageOf, requireActor } from './actor';

const account = { href: '/account', label: 'Account' };

const linksOf: Record<Role, { href: string; label: string }[]> = {
  homeowner: [{ href: '/homes', label: 'Homes' }, { href: '/calculator', label: 'Calculator' }, account],
  contractor: [{ href: '/work', label: 'Work' }, { href: '/calculator', label: 'Calculator' }, account],
  operator: [{ href: '/operator', label: 'Service' }, { href: '/operator/outbox', label: 'Outbox' }, { href: '/operator/mailbox', label: 'Mailbox' }, account],
};

/** Header and footer of the pages behind sign-in; only the roles named may be here. */
export async function SignedInFrame({ roles, children }: { roles?: Role[]; children: ReactNode }) {
  const actor = await requireActor(roles);
  return (
    <>
      <SiteHeader links={linksOf[actor.role]} home={homePageOf(actor.role)} signedInAs={actor.name ?? actor.email}>
        <SignOutButton />
      </SiteHeader>
      {hasConfirmedAddress(actor) ? null : <ConfirmBand email={actor.email} action={sendVerifyAgain} />}
      {children}
      <SiteFooter />
    </>
  );
}
