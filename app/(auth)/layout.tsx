import { type ReactNode } from 'react';
import { LinkButton } from '@/components/ui/button';
import { SiteFooter } from '@/components/ui/site-footer';
import { SiteHeader } from '@/components/ui/site-header';

export default function AuthLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <SiteHeader>
        <LinkButton href="/sign-in" look="plain">Sign in</LinkButton>
        <LinkButton href="/register" look="plain">Register</LinkButton>
      </SiteHeader>
      <main id="main">{children}</main>
      <SiteFooter />
    </>
  );
}
