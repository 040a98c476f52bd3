import { exactWindow, type Spell, windowWords } from '@/components/plan/window-words';
import { type CalendarDay } from '@/lib/calendar';

type WhenProps = { spell: Spell; today: CalendarDay };

/** A window in words; the exact days on hover, and in print. */
export function When({ spell, today }: WhenProps) {
  return (
    <span>
      <time dateTime={spell.opensOn} title={exactWindow(spell)}>
        {windowWords(spell, today)}
      </time>
      <span className="hidden print:inline"> ({exactWindow(spell)})</span>
    </span>
  );
}
