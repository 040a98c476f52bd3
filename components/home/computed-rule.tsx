import { Figure } from '@/components/ui/figure';
import { type WorkItem } from '@/lib/care/types';
import { ruleInWords } from '@/lib/care/own-rule';
import { exactDay, exactRange } from '@/lib/calendar-words';
import { withRule } from '@/lib/home/plan-view';
import { capital } from '@/lib/home/wall-words';

/** What the computed rule of one kind of work says, in words and as RFC 5545 writes it. */
export function ComputedRule({ item }: { item: WorkItem | undefined }) {
  if (!item) return <p>Nothing is computed for this work yet: there is no day to count from. Your own rule needs none.</p>;
  return (
    <div className="grid gap-2">
      {item.rule && item.startOn ? (
        <>
          <p className="text-lg">
            <strong>{capital(ruleInWords(item.rule))}.</strong> It counts from {exactDay(item.startOn)}.
          </p>
          <p>
            In the words of RFC 5545: <code className="break-all">{item.rule}</code>
          </p>
        </>
      ) : null}
      <p>
        It asks for the work {exactRange(item.window.opensOn, item.window.closesOn)}. {item.because}
      </p>
      <Figure explanation={withRule(item)} />
    </div>
  );
}
