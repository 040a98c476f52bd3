import { type ReactNode } from 'react';
import { requireActor } from '@/app/_server/actor';
import { SiteFooter } from '@/components/ui/site-footer';
import { SiteHeader } from '@/components/ui/site-header';

const links = [
  { href: '/operator', label: 'Service' },
  { href: '/operator/outbox', label: 'Outbox' },
  { href: '/operator/mailbox', label: 'Mailbox' },
];

export default async function OperatorLayout({ children }: { children: ReactNode }) {
  const actor = await requireActor(['operator']);
  return (
    <>
      <SiteHeader links={links} home="/operator" signedInAs={actor.name ?? actor.email} />
      {children}
      <SiteFooter />
    </>
  );
}
