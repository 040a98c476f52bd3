import { type HousePlanWall } from '@/components/drawings/house-plan';
import { SunSlider } from '@/components/drawings/sun-slider';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { type CalendarDay } from '@/lib/calendar';

type HouseCourseProps = {
  walls: readonly HousePlanWall[];
  home: { id: string; name: string; latitude: number; longitude: number; timeZone: string };
  today: CalendarDay;
  mayEdit: boolean;
};

/** The house from above: its walls are the way to their pages. */
export function HouseCourse({ walls, home, today, mayEdit }: HouseCourseProps) {
  return (
    <Course heading="The house" aside="Touch a wall to open it.">
      <SunSlider walls={walls} place={{ latitude: home.latitude, longitude: home.longitude, timeZone: home.timeZone }} day={today} label={`${home.name} from above, north up`} />
      {mayEdit ? (
        <div className="no-print mt-3">
          <LinkButton href={`/homes/${home.id}/walls/new`} look="plain">
            Add a wall
          </LinkButton>
        </div>
      ) : null}
    </Course>
  );
}
