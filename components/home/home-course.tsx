import Link from 'next/link';
import { type Route } from 'next';
import { When } from '@/components/plan/when';
import { StateMark } from '@/components/ui/state-mark';
import { type CalendarDay } from '@/lib/calendar';
import { missedSince, type WorkGroup, workWords } from '@/lib/home/next-work';
import { memberships, type Membership } from '@/lib/schemas/vocabulary';

type HomeCourseProps = { id: string; name: string; place: string; membership: Membership; wallCount: number; next: readonly WorkGroup[]; today: CalendarDay };

/** One home as one course: what is next, on which walls, when. */
export function HomeCourse({ id, name, place, membership, wallCount, next, today }: HomeCourseProps) {
  const [first] = next;
  return (
    <li className="course relative has-[a:hover]:bg-inset">
      <div className="within grid gap-x-10 gap-y-3 py-6 md:grid-cols-[minmax(0,1fr)_minmax(0,1.6fr)]">
        <div>
          <h2>
            <Link href={`/homes/${id}` as Route} className="link no-underline after:absolute after:inset-0">
              {name}
            </Link>
          </h2>
          <p className="text-quiet">
            {place} · {wallCount} {wallCount === 1 ? 'wall' : 'walls'}
            {membership === 'owner' ? '' : ` · you are ${memberships[membership].toLowerCase()}`}
          </p>
        </div>
        {first ? (
          <div className="grid justify-items-start gap-1">
            <StateMark state={first.state} />
            <p className="text-lg">
              <strong>{workWords(next, wallCount)}</strong>
            </p>
            <p>
              <When spell={{ ...first, missedOn: missedSince(next) }} today={today} capital />
            </p>
          </div>
        ) : (
          <p className="text-quiet">Nothing is planned: add a wall, or say what is on its wood.</p>
        )}
      </div>
    </li>
  );
}
