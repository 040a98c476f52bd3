import { exactWindow, windowWords } from '@/components/plan/window-words';
import { Figure } from '@/components/ui/figure';
import { Measure } from '@/components/ui/measure';
import { StateMark } from '@/components/ui/state-mark';
import { aboutDay, exactDay } from '@/lib/calendar-words';
import { directionWord } from '@/lib/home/direction';
import { withRule } from '@/lib/home/plan-view';
import { type JobRow, type JobVisit, type JobWork } from '@/lib/jobs/work-ahead';
import { textures, type UnitSystem, workKinds } from '@/lib/schemas/vocabulary';

type WallJobProps = { row: JobRow; visit: JobVisit; units: UnitSystem };

/** One wall of a visit: what it is, and the work on it; each opens to its reason. */
export function WallJob({ row, visit, units }: WallJobProps) {
  return (
    <li className="grid gap-x-6 border-t border-line py-3 md:grid-cols-[13rem_minmax(0,1fr)]">
      <div className="md:pt-2">
        <p className="font-semibold">{row.wallName}</p>
        <p className="text-sm text-quiet">
          faces {directionWord(row.azimuthDeg)}, <Measure kind="area" value={row.areaM2} units={units} />, {textures[row.texture].toLowerCase()}
        </p>
      </div>
      <ul>
        {row.works.map((work) => (
          <li key={work.kind} className="grid grid-cols-[7rem_minmax(0,1fr)] gap-x-3 sm:grid-cols-[8rem_minmax(0,1fr)] max-sm:[&>details[open]]:col-span-full">
            <p className="flex min-h-11 items-center self-start">
              <StateMark state={work.state} />
            </p>
            <Figure explanation={withRule(work)} because={work.because} label={null} value={<Title work={work} visit={visit} />} />
          </li>
        ))}
      </ul>
    </li>
  );
}

/** The kind of work, since when it is overdue, and its own days where they differ from the visit's. */
function Title({ work, visit }: { work: JobWork; visit: JobVisit }) {
  const { kind, window, state, missedOn } = work;
  if (window.opensOn !== visit.opensOn || window.closesOn !== visit.closesOn) {
    const spell = { state, missedOn, ...window };
    return (
      <span title={exactWindow(spell)}>
        {workKinds[kind]}, {windowWords(spell, visit.today)}
      </span>
    );
  }
  const since = missedOn ?? window.closesOn;
  return state === 'overdue' ? <span title={exactDay(since)}>{`${workKinds[kind]}, since ${aboutDay(since)}`}</span> : workKinds[kind];
}
