/** An eave over two courses. */
export function Mark({ size = 32 }: { size?: number }) {
  return (
    <svg viewBox="0 0 32 32" width={size} height={size} aria-hidden="true" fill="none" stroke="currentColor" strokeWidth="3.2" strokeLinecap="round" strokeLinejoin="round">
      <path d="M2.5 15.5 16 4.5l13.5 11" />
      <path d="M8 20.5h16M8 27h16" />
    </svg>
  );
}

export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-2.5 font-display text-xl font-bold tracking-tight">
      <Mark />
      Eavewright
    </span>
  );
}
