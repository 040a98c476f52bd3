import { FormMessage } from '@/components/ui/form-message';
import { Money } from '@/components/ui/measure';
import { exactDay, exactRange } from '@/lib/calendar-words';
import { type OwnPreview } from '@/lib/care/own-preview';
import { monthsInWords } from '@/lib/coat/life-words';
import { capital } from '@/lib/home/wall-words';

/** The days on which a rule falls and when the work is then done, or why the rule is refused. */
export function RuleDays({ preview }: { preview: OwnPreview }) {
  if (!preview.ok) return <FormMessage tone="note">{preview.error}</FormMessage>;
  const { words, countedFrom, days, missedOn, pastLife } = preview;
  return (
    <div className="grid gap-3">
      <p>
        <strong>{capital(words)}.</strong> Counted from {exactDay(countedFrom)}. Logged work moves the days after it.
      </p>
      {missedOn ? <FormMessage tone="note">The time for the first day closed on {exactDay(missedOn)}. The work would be overdue at once.</FormMessage> : null}
      <ol className="figures">
        {days.map(({ dueOn, opensOn, closesOn }) => (
          <li key={dueOn} className="border-t border-line py-2 first:border-t-0">
            <strong>{exactDay(dueOn)}</strong>
            <span className="text-quiet"> → done between {exactRange(opensOn, closesOn).replace(' – ', ' and ')}</span>
          </li>
        ))}
      </ol>
      {pastLife ? (
        <FormMessage tone="note">
          This rule goes about {monthsInWords(pastLife.months)} past the expected life of the coat ({monthsInWords(pastLife.lifeMonths)}). By then the wall may need stripping. At the prices of this home that adds about <Money cents={pastLife.stripCents} />.
        </FormMessage>
      ) : null}
    </div>
  );
}
