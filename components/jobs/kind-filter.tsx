import { type Route } from 'next';
import Link from 'next/link';

const kinds = [
  { kind: undefined, label: 'All work' },
  { kind: 'restain', label: 'Restains' },
  { kind: 'recaulk', label: 'Recaulks' },
] as const;

export type JobKind = 'restain' | 'recaulk';
export const jobKind = (text: string | string[] | undefined): JobKind | undefined => (text === 'restain' || text === 'recaulk' ? text : undefined);

/** Which kind of work is shown. */
export function KindFilter({ chosen }: { chosen: JobKind | undefined }) {
  return (
    <nav aria-label="Kind of work" className="within no-print -mt-3 pb-3">
      <ul className="-mx-3 flex flex-wrap">
        {kinds.map(({ kind, label }) => (
          <li key={label}>
            <Link
              href={(kind ? `/work?kind=${kind}` : '/work') as Route}
              aria-current={kind === chosen ? 'true' : undefined}
              className="flex min-h-12 items-center border-b-4 border-transparent px-3 font-semibold text-spruce no-underline hover:border-line aria-[current=true]:border-spruce"
            >
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
