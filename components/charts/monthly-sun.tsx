'use client';

import dynamic from 'next/dynamic';
import { monthNames } from '@/lib/calendar-words';

const MonthlySunBars = dynamic(() => import('@/components/charts/monthly-sun-bars'), {
  ssr: false,
  loading: () => <p className="grid h-56 place-items-center text-quiet">Drawing the months…</p>,
});

type MonthlySunProps = {
  wallName: string;
  /** Sun dose of each month of a mean year, January first, kWh/m². */
  doseMonthly: readonly number[];
};

/** Bars of a wall's sun dose by month, with the same figures as a table. */
export function MonthlySun({ wallName, doseMonthly }: MonthlySunProps) {
  const months = monthNames.map((name, i) => ({ name, dose: Math.round(doseMonthly[i] ?? 0) }));
  return (
    <figure className="min-w-0">
      <div aria-hidden="true" className="no-print h-56">
        <MonthlySunBars months={months} />
      </div>
      <figcaption className="text-sm text-quiet">Sun on the wall “{wallName}” by month of a mean year, kWh/m².</figcaption>
      <details>
        <summary className="inline-flex min-h-11 items-center text-sm">
          <span className="link">The same as a table</span>
        </summary>
        <table className="w-full max-w-xs text-sm">
          <caption className="sr-only">Sun dose of the wall {wallName} by month</caption>
          <thead>
            <tr className="border-b-2 border-line">
              <th scope="col" className="py-1 text-left">
                Month
              </th>
              <th scope="col" className="py-1 text-right">
                kWh/m²
              </th>
            </tr>
          </thead>
          <tbody>
            {months.map((month) => (
              <tr key={month.name} className="border-b border-line">
                <th scope="row" className="py-1 text-left font-normal">
                  {month.name}
                </th>
                <td className="py-1 text-right">{month.dose}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </details>
    </figure>
  );
}
