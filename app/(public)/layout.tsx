import Link from 'next/link';
import { type ReactNode } from 'react';
import { SiteFooter } from '@/components/ui/site-footer';
import { SiteHeader } from '@/components/ui/site-header';

export default function PublicLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <SiteHeader>
        <Link href="/sign-in" className="inline-flex min-h-12 items-center text-base font-semibold underline underline-offset-4">
          Sign in
        </Link>
      </SiteHeader>
      <main id="main">{children}</main>
      <SiteFooter />
    </>
  );
}
