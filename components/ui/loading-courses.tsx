type LoadingCoursesProps = { label?: string; count?: number };

/** Blank courses while a page is fetched. */
export function LoadingCourses({ label = 'Loading', count = 4 }: LoadingCoursesProps) {
  return (
    <main id="main" aria-busy="true">
      <p role="status" className="sr-only">
        {label}
      </p>
      <div aria-hidden="true">
        <div className="within pt-8 pb-8">
          <div className="h-10 w-2/3 max-w-md animate-pulse rounded bg-line" />
        </div>
        {Array.from({ length: count }, (_, row) => (
          <div key={row} className="course">
            <div className="within grid gap-3 py-8">
              <div className="h-5 w-40 animate-pulse rounded bg-line" />
              <div className="h-4 w-full max-w-xl animate-pulse rounded bg-inset" />
            </div>
          </div>
        ))}
      </div>
    </main>
  );
}
