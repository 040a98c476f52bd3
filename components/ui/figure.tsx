import { type ReactNode } from 'react';
import { type Explanation, groundWords } from '@/lib/explain';

type FigureProps = {
  explanation: Explanation;
  /** Shown in place of the explanation's own value, in the reader's units. */
  value?: ReactNode;
  /** Shown in place of the name of the figure; null leaves it out (it is still said aloud). */
  label?: ReactNode;
  /** A sentence that stands before the formula. */
  because?: string;
  size?: 'line' | 'large';
};

/** A figure that the product computed; opened, it shows its inputs, formula and sources. */
export function Figure({ explanation, value, label, because, size = 'line' }: FigureProps) {
  const name = label === undefined ? explanation.figure : label;
  return (
    <details className="group min-w-0">
      <summary className={`flex min-h-11 list-none items-center gap-2 ${size === 'large' ? 'flex-wrap' : ''} [&::-webkit-details-marker]:hidden`}>
        <span className={name === null ? 'sr-only' : size === 'large' ? 'w-full text-quiet' : 'text-quiet'}>{name ?? explanation.figure}</span>
        <span className="flex min-w-0 items-center gap-2">
          <span className={`figures min-w-0 ${size === 'large' ? 'text-2xl' : 'text-lg'} underline decoration-lichen decoration-dotted decoration-2 underline-offset-4`}>{value ?? explanation.value}</span>
          <svg viewBox="0 0 20 20" width="18" height="18" aria-hidden="true" className="no-print shrink-0 text-quiet transition-transform group-open:rotate-180">
            <path d="m4 7 6 6 6-6" fill="none" stroke="currentColor" strokeWidth="2.5" strokeLinecap="round" strokeLinejoin="round" />
          </svg>
        </span>
        <span className="sr-only">: how this comes about</span>
      </summary>
      <div className="mt-1 mb-3 max-w-prose border-l-4 border-lichen bg-inset px-4 py-3 text-sm">
        {because ? <p className="mb-3 text-base">{because}</p> : null}
        <p>
          {explanation.figure} = {explanation.formula}
        </p>
        {explanation.inputs.length > 0 ? (
          <dl className="mt-3 grid grid-cols-[fit-content(50%)_minmax(0,1fr)] gap-x-4 gap-y-1">
            {explanation.inputs.map((input) => (
              <div key={input.label} className="col-span-2 grid grid-cols-subgrid border-t border-line pt-1">
                <dt>{input.label}</dt>
                <dd className="text-right font-semibold wrap-anywhere tabular-nums">{input.value}</dd>
              </div>
            ))}
          </dl>
        ) : null}
        <ul className="mt-3 grid gap-1 text-quiet">
          {explanation.sources.map((source) => (
            <li key={source.text}>
              {source.text} <span className="whitespace-nowrap">({groundWords[source.ground]})</span>
            </li>
          ))}
        </ul>
      </div>
    </details>
  );
}
