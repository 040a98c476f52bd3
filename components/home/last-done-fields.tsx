import { DateInput } from '@/components/ui/date-input';
import { type CalendarDay } from '@/lib/calendar';
import { exactDay } from '@/lib/calendar-words';

type LastDoneFieldsProps = {
  today: CalendarDay;
  /** Null is "not known"; undefined is not answered yet. */
  stained?: CalendarDay | null | undefined;
  caulked?: CalendarDay | null | undefined;
  /** Logged since, by somebody. */
  logged?: { restain?: CalendarDay | undefined; recaulk?: CalendarDay | undefined };
};

/** When the coat and the joints were last done. "Not known" is an answer, and leads to a walkaround first. */
export function LastDoneFields({ today, stained, caulked, logged = {} }: LastDoneFieldsProps) {
  const notKnown = 'Not sure of the day? Any day of that month will do. "Not known" is an answer too: it leads to a walkaround first.';
  return (
    <div className="grid gap-5">
      {logged.restain || logged.recaulk ? (
        <p>
          In the record: {[logged.restain ? `restained on ${exactDay(logged.restain)}` : '', logged.recaulk ? `recaulked on ${exactDay(logged.recaulk)}` : ''].filter(Boolean).join(', ')}. That counts; what follows is only for what came before.
        </p>
      ) : null}
      <DateInput label="Last stained" name="stained.on" hint={notKnown} max={today} defaultValue={stained ?? undefined} notKnownName="stained.notKnown" defaultNotKnown={stained === null} />
      <DateInput label="Last caulked" name="caulked.on" max={today} defaultValue={caulked ?? undefined} notKnownName="caulked.notKnown" defaultNotKnown={caulked === null} />
    </div>
  );
}
