'use client';

import dynamic from 'next/dynamic';

type MonthsOfSunProps = { doseKwhM2: number[]; hours: number[] };

/** The chart is heavy: it comes after the page. */
const MonthlySun = dynamic(() => import('@/components/charts/monthly-sun').then((module) => module.MonthlySun), {
  ssr: false,
  loading: () => <p className="min-h-72 text-quiet">Drawing the months…</p>,
});

export function MonthsOfSun({ doseKwhM2, hours }: MonthsOfSunProps) {
  return <MonthlySun doseKwhM2={doseKwhM2} hours={hours} />;
}
