import { type ReactNode } from 'react';
import { Course, type Tone } from '@/components/ui/course';
import { Measure } from '@/components/ui/measure';
import { type JobTotals } from '@/lib/jobs/work-ahead';
import { type UnitSystem } from '@/lib/schemas/vocabulary';

type SeasonHeadProps = { id: string; title: ReactNode; totals: JobTotals; withOverdue?: JobTotals | null; units: UnitSystem; tone?: Tone };

const count = (n: number, one: string, many: string) => (n === 1 ? `1 ${one}` : `${n} ${many}`);

/** Heads the work of a season, with what it adds up to. */
export function SeasonHead({ id, title, totals, withOverdue, units, tone = 'quiet' }: SeasonHeadProps) {
  return (
    <Course as="div" tone={tone}>
      <h2 id={id}>{title}</h2>
      <p className="mt-1 text-lg">
        {count(totals.homes, 'home', 'homes')}, {count(totals.works, 'piece', 'pieces')} of work; <Stain totals={totals} units={units} />.
      </p>
      {withOverdue ? (
        <p className="text-quiet">
          With what is overdue: <Stain totals={withOverdue} units={units} />.
        </p>
      ) : null}
    </Course>
  );
}

function Stain({ totals: { stainM2, buyL }, units }: { totals: JobTotals; units: UnitSystem }) {
  if (stainM2 === 0) return <>caulk only</>;
  return (
    <>
      <Measure kind="area" value={stainM2} units={units} /> to stain, <Measure kind="volume" value={buyL} units={units} /> of stain to buy
    </>
  );
}
