import { type ReactNode } from 'react';

type FormMessageProps = { tone: 'done' | 'fault' | 'note'; children: ReactNode };

const tones = {
  done: 'border-spruce bg-snow',
  fault: 'border-ember bg-ember-wash',
  note: 'border-honey bg-honey-wash',
};
const marks = { done: 'M5 12.5 10 17.5 19 6.5', fault: 'M12 5v9M12 18.5v.5', note: 'M12 10v9M12 5v.5' };

/** What came of a form, in a strip with a mark and words. */
export function FormMessage({ tone, children }: FormMessageProps) {
  return (
    <div className={`flex gap-3 border-l-8 px-4 py-3 ${tones[tone]}`}>
      <svg viewBox="0 0 24 24" width="24" height="24" aria-hidden="true" className="mt-0.5 shrink-0" fill="none" stroke="currentColor" strokeWidth="3" strokeLinecap="round">
        <path d={marks[tone]} />
      </svg>
      <div className="min-w-0">{children}</div>
    </div>
  );
}
