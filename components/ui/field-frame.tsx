import { type ReactNode } from 'react';

export type FrameProps = { label: ReactNode; hint?: ReactNode; optional?: boolean };

export const controlClass =
  'block w-full min-h-12 rounded-md border-2 border-lichen bg-snow px-3 py-2 text-ink aria-invalid:border-ember aria-invalid:bg-ember-wash disabled:opacity-60';

/** Ties a control to its label, hint and fault. */
export function describe(id: string, hint: unknown, error: string | undefined) {
  const ids = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(Boolean).join(' ');
  return { id, 'aria-describedby': ids || undefined, 'aria-invalid': error ? (true as const) : undefined };
}

export function FieldError({ id, children }: { id: string; children: ReactNode }) {
  return (
    <p id={`${id}-error`} className="flex items-start gap-2 font-semibold text-ember">
      <svg viewBox="0 0 20 20" width="20" height="20" aria-hidden="true" className="mt-1 shrink-0">
        <path d="M10 1 19 18H1Z" fill="currentColor" />
        <path d="M10 7v5M10 14.6v.4" stroke="var(--snow)" strokeWidth="2" strokeLinecap="round" />
      </svg>
      {children}
    </p>
  );
}

type FieldFrameProps = FrameProps & { id: string; error: string | undefined; children: ReactNode };

export function FieldFrame({ id, label, hint, optional = false, error, children }: FieldFrameProps) {
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className="font-semibold">
        {label}
        {optional ? <span className="font-normal text-quiet"> (may stay empty)</span> : null}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="text-quiet">
          {hint}
        </p>
      ) : null}
      {children}
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </div>
  );
}
