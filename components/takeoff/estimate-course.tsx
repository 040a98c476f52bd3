import { EstimateResult } from '@/components/takeoff/estimate-result';
import { Button } from '@/components/ui/button';
import { FormMessage } from '@/components/ui/form-message';
import { Money } from '@/components/ui/measure';
import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { type StainAnswer } from '@/lib/takeoff/estimate';
import { containersText } from '@/lib/takeoff/words';
import { volumeText } from '@/lib/units';

export type ShownEstimate = {
  answer: StainAnswer | undefined;
  units: UnitSystem;
  waiting: boolean;
  failure: string | undefined;
  retry: () => void;
  /** Some field is wrong; the fault of the whole form, if that is what is wrong. */
  faulty: boolean;
  fault: string | undefined;
  /** What does not count yet. */
  left: readonly string[];
  /** Said while there is nothing to work out; null when there is. */
  nothing: string | null;
};

/** What to buy, beside the form on wide screens, after the walls on narrow ones. */
export function EstimateCourse({ answer, units, waiting, failure, retry, faulty, fault, left, nothing }: ShownEstimate) {
  return (
    <section aria-label="What to buy" aria-busy={waiting} className="grid content-start gap-4 border-t-2 border-lichen pt-4 lg:sticky lg:top-6 lg:col-start-2 lg:row-span-2 lg:row-start-1 lg:self-start lg:border-t-0 lg:pt-0">
      {failure ? (
        <FormMessage tone="fault">
          <p>{failure} What you typed is still here.</p>
          <div className="needs-script">
            <Button look="plain" onClick={retry}>
              Try again
            </Button>
          </div>
        </FormMessage>
      ) : null}
      {faulty ? <FormMessage tone="note">{fault ?? 'Look at the marked fields; the amount follows.'}</FormMessage> : null}
      {left.length > 0 ? (
        <FormMessage tone="note">
          {left.map((words) => (
            <p key={words}>{words}</p>
          ))}
        </FormMessage>
      ) : null}
      {answer ? <EstimateResult answer={answer} units={units} /> : null}
      {nothing && !faulty ? <p className="text-quiet">{nothing}</p> : null}
    </section>
  );
}

/** The amount in one line: stays in sight on phones while one types below it, and is said aloud when it changes. */
export function EstimateLine({ answer, units, faulty }: ShownEstimate) {
  const shown = answer && !faulty;
  return (
    <p role="status" className={`no-print ${shown ? 'sticky bottom-0 -mx-4 flex flex-wrap items-baseline gap-x-3 border-t-4 border-spruce bg-snow px-4 py-2.5 lg:sr-only' : 'sr-only'}`}>
      {shown ? (
        <>
          <span className="figures text-lg">{volumeText(answer.buyL, units)}</span>
          <span>
            {containersText(answer.containers, units)}, <Money cents={answer.priceCents} />
          </span>
        </>
      ) : null}
    </p>
  );
}
