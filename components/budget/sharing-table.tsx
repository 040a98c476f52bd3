import { Figure } from '@/components/ui/figure';
import { type Grouping } from '@/lib/care/grouping';
import { type Explanation } from '@/lib/explain';

type SharingTableProps = { grouping: Grouping; explanations: readonly Explanation[] };

/** What each choice of sharing trips would cost a year; the one that the plan goes by is marked in words. */
export function SharingTable({ grouping, explanations }: SharingTableProps) {
  return (
    <table className="w-full max-w-2xl">
      <caption className="mb-2 text-left">Walls due within so many months of a trip share it, where that costs less than another trip.</caption>
      <thead>
        <tr className="border-b-2 border-line align-bottom">
          <th scope="col" className="py-2 pr-4 text-left">
            Months
          </th>
          <th scope="col" className="py-2 pr-4 text-right">
            Trips in 20 years
          </th>
          <th scope="col" className="py-2 text-left">
            Cost a year
          </th>
        </tr>
      </thead>
      <tbody>
        {grouping.choices.map(({ months, trips }, i) => {
          const isChosen = months === grouping.months;
          const explanation = explanations[i];
          return (
            <tr key={months} className={`border-b border-line align-top ${isChosen ? 'bg-inset font-semibold' : ''}`}>
              <th scope="row" className={`py-2.5 pr-4 text-left ${isChosen ? '' : 'font-normal'}`}>
                {months === 0 ? 'None' : months}
                {isChosen ? ' (the plan goes by this)' : ''}
              </th>
              <td className="figures py-2.5 pr-4 text-right">{trips}</td>
              <td>{explanation ? <Figure explanation={explanation} label={null} /> : null}</td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
