'use client';

import dynamic from 'next/dynamic';

const YearsAheadBars = dynamic(() => import('@/components/charts/years-ahead-bars'), {
  ssr: false,
  loading: () => <p className="grid h-64 place-items-center text-quiet">Drawing the years…</p>,
});

type YearsAheadChartProps = { years: readonly { year: number; cents: number }[] };

/** Bars of what each year costs. The same figures stand in the table beside it, so it is left out of print and of what is read aloud. */
export function YearsAheadChart({ years }: YearsAheadChartProps) {
  return (
    <div aria-hidden="true" className="no-print h-64 min-w-0">
      <YearsAheadBars years={years} />
    </div>
  );
}
