import { StateShape } from '@/components/ui/state-shape';
import { type Check, type Verdict } from '@/lib/day/checks';
import { groundWords } from '@/lib/explain';

const shapes = { go: 'done', wait: 'put off', no: 'overdue' } as const;
export const verdictWords: Record<Verdict, string> = { go: 'Go', wait: 'Wait', no: 'No' };

export const VerdictShape = ({ verdict, size }: { verdict: Verdict; size?: number }) => <StateShape state={shapes[verdict]} {...(size ? { size } : {})} />;

/** What was checked, one course each; opened, a check shows its limit and who says so. */
export function CheckList({ checks }: { checks: readonly Check[] }) {
  return (
    <ul className="border-t border-line">
      {checks.map((check) => (
        <li key={check.what} className="border-b border-line">
          <details className="group">
            <summary className="grid min-h-14 list-none grid-cols-[auto_minmax(0,1fr)_auto] items-center gap-x-3 py-2 [&::-webkit-details-marker]:hidden">
              <VerdictShape verdict={check.verdict} />
              <span>
                <span className="font-semibold">
                  {verdictWords[check.verdict]}: {check.what.toLowerCase()}
                </span>
                <span className="block">{check.because}</span>
              </span>
              <svg viewBox="0 0 20 20" width="18" height="18" aria-hidden="true" className="no-print text-quiet transition-transform group-open:rotate-180">
                <path d="m4 7 6 6 6-6" fill="none" stroke="currentColor" strokeWidth="2.5" strokeLinecap="round" strokeLinejoin="round" />
              </svg>
            </summary>
            <div className="mb-3 border-l-4 border-lichen bg-inset px-4 py-3 text-sm">
              <p>Limit: {check.limit}.</p>
              <p className="mt-1 text-quiet">
                {check.source.text} ({groundWords[check.source.ground]})
              </p>
            </div>
          </details>
        </li>
      ))}
    </ul>
  );
}
