import { When } from '@/components/plan/when';
import { StateMark } from '@/components/ui/state-mark';
import { type CalendarDay } from '@/lib/calendar';
import { type WorkGroup } from '@/lib/home/next-work';
import { wallWords } from '@/lib/home/wall-words';
import { workKinds } from '@/lib/schemas/vocabulary';

type UpcomingListProps = { groups: readonly WorkGroup[]; wallCount: number; today: CalendarDay };

/** What comes after: kind, walls, state and window, one line each. */
export function UpcomingList({ groups, wallCount, today }: UpcomingListProps) {
  return (
    <ul>
      {groups.map((group) => (
        <li key={`${group.kind} ${group.opensOn} ${group.walls[0]?.id}`} className="grid gap-x-6 border-t border-line py-3 first:border-t-0 sm:grid-cols-[8rem_minmax(0,1fr)]">
          <StateMark state={group.state} />
          <p>
            <strong>{workKinds[group.kind]}</strong> {wallWords(group.walls, wallCount)}: <When spell={group} today={today} />
          </p>
        </li>
      ))}
    </ul>
  );
}
