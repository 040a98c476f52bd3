import { type Route } from 'next';
import Link from 'next/link';
import { type ReactNode } from 'react';
import { type NavLink, NavLinks } from '@/components/ui/nav-links';
import { Wordmark } from '@/components/ui/wordmark';

type SiteHeaderProps = {
  links?: readonly NavLink[];
  /** Name or address of the person signed in. */
  signedInAs?: string | undefined;
  /** Where the wordmark leads. */
  home?: string;
  /** Stands at the far end: a sign-out form, a sign-in link. */
  children?: ReactNode;
};

export function SiteHeader({ links = [], signedInAs, home = '/', children }: SiteHeaderProps) {
  return (
    <header className="course-roof on-roof no-print">
      <div className="within flex flex-wrap items-center gap-x-8">
        <Link href={home as Route} className="flex min-h-14 items-center no-underline" aria-label="Eavewright, first page">
          <Wordmark />
        </Link>
        {links.length > 0 ? (
          <nav aria-label="Main" className="order-last w-full md:order-none md:w-auto">
            <NavLinks links={links} />
          </nav>
        ) : null}
        <div className="ml-auto flex min-h-14 items-center gap-4 text-sm">
          {signedInAs ? <span className="max-w-40 truncate max-sm:hidden" title={signedInAs}>{signedInAs}</span> : null}
          {children}
        </div>
      </div>
    </header>
  );
}
