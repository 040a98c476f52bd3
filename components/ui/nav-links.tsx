'use client';

import { type Route } from 'next';
import Link from 'next/link';
import { usePathname } from 'next/navigation';

export type NavLink = { href: string; label: string };

/** The longest link that the page's path starts with is the current one. */
export function currentLink(links: readonly NavLink[], pathname: string): string | undefined {
  return links
    .filter((link) => pathname === link.href || pathname.startsWith(`${link.href}/`))
    .sort((a, b) => b.href.length - a.href.length)[0]?.href;
}

export function NavLinks({ links }: { links: readonly NavLink[] }) {
  const current = currentLink(links, usePathname());
  return (
    <ul className="-mx-3 flex flex-wrap">
      {links.map((link) => (
        <li key={link.href}>
          <Link
            href={link.href as Route}
            aria-current={link.href === current ? 'page' : undefined}
            className="flex min-h-12 items-center border-b-4 border-transparent px-3 pt-1 font-semibold no-underline hover:border-on-roof/40 aria-[current=page]:border-on-roof"
          >
            {link.label}
          </Link>
        </li>
      ))}
    </ul>
  );
}
