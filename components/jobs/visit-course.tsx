import { CaulkFigures } from '@/components/jobs/caulk-figures';
import { StainFigures } from '@/components/jobs/stain-figures';
import { WallJob } from '@/components/jobs/wall-job';
import { When } from '@/components/plan/when';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { type JobVisit } from '@/lib/jobs/work-ahead';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

export type Owner = { name: string | null; email: string };
type VisitCourseProps = { visit: JobVisit; owner: Owner | undefined; units: UnitSystem };

/** The log form with the work that comes first in this visit chosen. */
function logAddress({ home, rows }: JobVisit): string {
  const works = rows.flatMap((row) => row.works);
  const kind = works.some((work) => work.kind === 'recaulk') ? 'recaulk' : 'restain';
  const walls = works.filter((work) => work.kind === kind).map(({ wallId }) => ['wall', wallId]);
  return `/work/${home.id}/log?${new URLSearchParams([['kind', kind], ...walls])}`;
}

/** One trip to one home: one row a wall, in plan order, and what it takes. */
export function VisitCourse({ visit, owner, units }: VisitCourseProps) {
  const { home, rows, opensOn, closesOn, today, stain, caulk } = visit;
  const late = rows.every(({ works }) => works.every(({ state }) => state === 'overdue'));
  return (
    <Course
      as="article"
      level={3}
      heading={home.name}
      aside={
        <>
          <p>{[home.place, home.state].filter(Boolean).join(', ')}</p>
          {owner ? (
            <p>
              {owner.name ?? 'Owner'}
              <br />
              <a className="link inline-flex min-h-11 items-center" href={`mailto:${owner.email}?subject=${encodeURIComponent(home.name)}`}>
                {owner.email}
              </a>
            </p>
          ) : null}
        </>
      }
    >
      <p className="figures mb-2 text-lg">
        {late ? 'Next chance ' : ''}
        <When spell={{ state: opensOn <= today ? 'due' : 'later', opensOn, closesOn, missedOn: null }} today={today} capital={!late} />
      </p>
      <ul>
        {rows.map((row) => (
          <WallJob key={row.wallId} row={row} visit={visit} units={units} />
        ))}
      </ul>
      <div className="grid gap-3 border-t-2 border-lichen pt-3">
        {stain ? <StainFigures stain={stain} units={units} /> : null}
        {caulk ? <CaulkFigures caulk={caulk} units={units} /> : null}
      </div>
      <p className="no-print mt-4 flex flex-wrap gap-3">
        <LinkButton href={logAddress(visit)} look={late || opensOn <= today ? 'primary' : 'quiet'}>
          Log work here
        </LinkButton>
        <LinkButton href={`/work/${home.id}`} look="quiet">
          The home
        </LinkButton>
      </p>
    </Course>
  );
}
