import { CheckList, VerdictShape } from '@/components/day/check-list';
import { FormMessage } from '@/components/ui/form-message';
import { type DayAnswer } from '@/lib/day/check-day';
import { type DayWork, type Verdict } from '@/lib/day/checks';

const headline: Record<Verdict, (work: DayWork) => string> = {
  go: (work) => `Go: today is a day to ${work}`,
  wait: (work) => `Wait: not yet a day to ${work}`,
  no: (work) => `No: today is no day to ${work}`,
};

type DayAnswerProps = { answer: DayAnswer | null; work: DayWork; faulty: boolean };

/** Go, wait or no, and every limit behind it. Beside the form on wide screens, after it on narrow ones. */
export function DayAnswerCourse({ answer, work, faulty }: DayAnswerProps) {
  return (
    <section aria-label="Answer" className="grid content-start gap-4 border-t-2 border-lichen pt-4 lg:sticky lg:top-6 lg:self-start lg:border-t-0 lg:pt-0">
      {faulty ? <FormMessage tone="note">Look at the marked fields; the answer follows.</FormMessage> : null}
      {!answer && !faulty ? <p className="text-quiet">Type the temperature and the humidity to see whether today is the day. At 68 °F (20 °C) and 60 % with a dry day before and after, it is.</p> : null}
      {answer ? (
        <>
          <h2 className="flex items-start gap-3">
            <span className="mt-1">
              <VerdictShape verdict={answer.verdict} size={28} />
            </span>
            {headline[answer.verdict](work)}
          </h2>
          <CheckList checks={answer.checks} />
          <p className="text-quiet">The label of the product wins over every limit here.</p>
        </>
      ) : null}
    </section>
  );
}

/** The answer in one line: stays in sight on phones while one types above it, and is said aloud when it changes. */
export function DayAnswerLine({ answer, work }: Omit<DayAnswerProps, 'faulty'>) {
  return (
    <p role="status" className={`no-print ${answer ? 'sticky bottom-0 -mx-4 flex items-center gap-3 border-t-4 border-spruce bg-snow px-4 py-2.5 font-semibold lg:sr-only' : 'sr-only'}`}>
      {answer ? (
        <>
          <VerdictShape verdict={answer.verdict} />
          {headline[answer.verdict](work)}
        </>
      ) : null}
    </p>
  );
}
