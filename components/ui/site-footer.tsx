import Link from 'next/link';

export function SiteFooter() {
  return (
    <footer className="no-print mt-auto">
      <div className="within flex flex-wrap items-center gap-x-8 py-4 text-sm text-quiet">
        <p className="max-w-xl">Product labels, your local code and a licensed tradesperson come before anything said here.</p>
        <Link href="/sources" className="link ml-auto inline-flex min-h-11 items-center max-md:ml-0">
          Sources of the figures
        </Link>
      </div>
    </footer>
  );
}
