import { exactWindow, type Spell, windowWords } from '@/components/plan/window-words';
import { type CalendarDay } from '@/lib/calendar';

type WhenProps = { spell: Spell; today: CalendarDay; /** Begins a sentence and ends it. */ capital?: boolean };

/** A window in words; the exact days on hover, and in print. */
export function When({ spell, today, capital = false }: WhenProps) {
  const words = windowWords(spell, today);
  return (
    <span>
      <time dateTime={spell.opensOn} title={exactWindow(spell)}>
        {capital ? `${words.charAt(0).toUpperCase()}${words.slice(1)}.` : words}
      </time>
      <span className="hidden print:inline"> ({exactWindow(spell)})</span>
    </span>
  );
}
