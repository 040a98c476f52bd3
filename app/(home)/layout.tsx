import { type ReactNode } from 'react';
import { requireActor } from '@/app/_server/actor';
import { SiteFooter } from '@/components/ui/site-footer';
import { SiteHeader } from '@/components/ui/site-header';

const links = [
  { href: '/homes', label: 'Homes' },
  { href: '/settings', label: 'Settings' },
];

export default async function HomeownerLayout({ children }: { children: ReactNode }) {
  const actor = await requireActor(['homeowner']);
  return (
    <>
      <SiteHeader links={links} home="/homes" signedInAs={actor.name ?? actor.email} />
      {children}
      <SiteFooter />
    </>
  );
}
