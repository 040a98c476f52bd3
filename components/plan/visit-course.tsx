import { KindRows } from '@/components/plan/kind-rows';
import { Course } from '@/components/ui/course';
import { aboutRange, exactRange, fromToday } from '@/lib/calendar-words';
import { type CalendarDay } from '@/lib/calendar';
import { type PlanVisit } from '@/lib/home/plan-view';
import { capital } from '@/lib/home/wall-words';
import { type WorkKind } from '@/lib/schemas/vocabulary';

/** Dirt comes off first, caulk goes on before stain. */
const sequence: WorkKind[] = ['walkaround', 'wash', 'recaulk', 'restain'];

type VisitCourseProps = { homeId: string; visit: PlanVisit; today: CalendarDay; wallCount: number; mayLog: boolean; mayPutOff: boolean };

/** Work that one trip does, in the order in which it is done. */
export function VisitCourse({ homeId, visit, today, wallCount, mayLog, mayPutOff }: VisitCourseProps) {
  const { opensOn, closesOn } = visit;
  return (
    <Course heading={<span title={exactRange(opensOn, closesOn)}>{capital(aboutRange(opensOn, closesOn))}</span>} aside={opensOn > today ? capital(fromToday(opensOn, today)) : 'Open now'} tone={opensOn <= today ? 'honey' : 'plain'}>
      <div className="grid gap-6">
        {sequence.map((kind) => {
          const items = visit.items.filter((item) => item.kind === kind);
          return items.length > 0 ? <KindRows key={kind} homeId={homeId} kind={kind} items={items} visit={visit} today={today} wallCount={wallCount} mayLog={mayLog} mayPutOff={mayPutOff} /> : null;
        })}
      </div>
    </Course>
  );
}
