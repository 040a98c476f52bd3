import { Figure } from '@/components/ui/figure';
import { type Explanation } from '@/lib/explain';

type YearsTableProps = {
  caption: string;
  years: readonly { year: number; words: readonly string[]; explanation: Explanation }[];
};

/** What is done in each year and what it costs; each cost opens. */
export function YearsTable({ caption, years }: YearsTableProps) {
  return (
    <table className="w-full">
      <caption className="sr-only">{caption}</caption>
      <thead>
        <tr className="border-b-2 border-line text-left">
          <th scope="col" className="py-2 pr-4">
            Year
          </th>
          <th scope="col" className="py-2">
            What is done, what it costs
          </th>
        </tr>
      </thead>
      <tbody>
        {years.map(({ year, words, explanation }) => (
          <tr key={year} className="break-inside-avoid border-b border-line align-top">
            <th scope="row" className="figures py-3 pr-4 text-left">
              {year}
            </th>
            <td className="grid gap-x-6 py-1.5 sm:grid-cols-[minmax(0,1fr)_minmax(7rem,auto)]">
              <div className="py-1.5">{words.length > 0 ? words.map((one) => <p key={one}>{one}</p>) : <p className="text-quiet">Nothing</p>}</div>
              <Figure explanation={explanation} label={null} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
