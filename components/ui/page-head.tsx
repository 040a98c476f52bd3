import { type Route } from 'next';
import Link from 'next/link';
import { type ReactNode } from 'react';

type PageHeadProps = {
  title: ReactNode;
  lead?: ReactNode;
  /** Where this page hangs: from the outermost inwards, without the page itself. */
  path?: { href: string; label: string }[];
  /** Buttons that belong to the whole page. */
  actions?: ReactNode;
};

export function PageHead({ title, lead, path = [], actions }: PageHeadProps) {
  return (
    <div className="within pt-5 pb-6 md:pt-8 md:pb-8">
      {path.length > 0 ? (
        <nav aria-label="Where you are" className="no-print -mt-2">
          <ol className="flex flex-wrap text-sm text-quiet">
            {path.map((step, i) => (
              <li key={step.href} className="flex items-center">
                <Link href={step.href as Route} className="link inline-flex min-h-11 items-center">
                  {step.label}
                </Link>
                {i < path.length - 1 ? (
                  <span aria-hidden="true" className="px-2">
                    /
                  </span>
                ) : null}
              </li>
            ))}
          </ol>
        </nav>
      ) : null}
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
        <div className="max-w-3xl">
          <h1>{title}</h1>
          {lead ? <p className="mt-2 text-lg text-quiet text-pretty">{lead}</p> : null}
        </div>
        {actions ? <div className="no-print flex flex-wrap gap-3">{actions}</div> : null}
      </div>
    </div>
  );
}
