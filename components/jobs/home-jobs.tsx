import { When } from '@/components/plan/when';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { Figure } from '@/components/ui/figure';
import { Measure } from '@/components/ui/measure';
import { StateMark } from '@/components/ui/state-mark';
import { directionWord } from '@/lib/home/direction';
import { type HomeJobs } from '@/lib/jobs/seasons';
import { type UnitSystem, workKinds } from '@/lib/schemas/vocabulary';
import { containersText } from '@/lib/takeoff/words';
import { volumeText } from '@/lib/units';

type Props = { jobs: HomeJobs; owner: { name: string | null; email: string } | undefined; units: UnitSystem };

/** One home's work in one season: its walls in plan order, with areas, and what stain they take. */
export function HomeJobsCourse({ jobs, owner, units }: Props) {
  const { home, rows, stain, stainM2, today } = jobs;
  return (
    <Course
      as="article"
      level={3}
      heading={home.name}
      aside={
        <>
          <p>{[home.place, home.state].filter(Boolean).join(', ')}</p>
          {owner ? <p>{owner.name ?? 'Owner'}, <a className="link" href={`mailto:${owner.email}`}>{owner.email}</a></p> : null}
        </>
      }
    >
      <ul>
        {rows.map((row) => (
          <li key={`${row.wallId} ${row.item.kind}`} className="grid gap-x-6 gap-y-1 border-t border-line py-3 first:border-t-0 md:grid-cols-[11rem_8rem_6rem_minmax(0,1fr)]">
            <p><strong>{workKinds[row.item.kind]}</strong> {row.wallName}<span className="block text-sm text-quiet">faces {directionWord(row.azimuthDeg)}</span></p>
            <p><StateMark state={row.state} /></p>
            <p><Measure kind="area" value={row.areaM2} units={units} /></p>
            <p className="max-w-prose"><When spell={{ state: row.state, ...row.item.window, missedOn: row.item.missedOn }} today={today} capital /></p>
          </li>
        ))}
      </ul>
      <div className="mt-3 grid gap-x-10 border-t-2 border-lichen pt-3 sm:grid-cols-2">
        {stain ? (
          <>
            <Figure explanation={stain.explanation} value={volumeText(stain.buyL, units)} />
            <p className="py-2">{containersText(stain.containers, units)} for <Measure kind="area" value={stainM2} units={units} /></p>
          </>
        ) : <p className="text-quiet">No stain in this season.</p>}
      </div>
      <p className="no-print mt-4 flex flex-wrap gap-3">
        <LinkButton href={`/work/${home.id}`} look="quiet">The home</LinkButton>
        <LinkButton href={`/work/${home.id}/log`} look="quiet">Log work here</LinkButton>
      </p>
    </Course>
  );
}
