'use client';

import { Bar, BarChart, CartesianGrid, LabelList, ResponsiveContainer, XAxis, YAxis } from 'recharts';

type MonthlySunBarsProps = { months: readonly { name: string; dose: number }[] };

/** Kept in a file of its own: it brings the chart library, which loads only when it is shown. */
export default function MonthlySunBars({ months }: MonthlySunBarsProps) {
  return (
    <ResponsiveContainer width="100%" height="100%">
      <BarChart accessibilityLayer={false} data={[...months]} margin={{ top: 24, right: 4, bottom: 0, left: -12 }} barCategoryGap="12%">
        <CartesianGrid vertical={false} stroke="var(--line)" />
        <XAxis dataKey="name" tickFormatter={(name: string) => name.slice(0, 1)} interval={0} tickLine={false} stroke="var(--ink)" tick={{ fill: 'var(--ink)', fontSize: 15 }} />
        <YAxis tickLine={false} axisLine={false} tick={{ fill: 'var(--quiet)', fontSize: 14 }} width={52} />
        <Bar dataKey="dose" fill="var(--dose-4)" stroke="var(--ink)" strokeWidth={1.5} isAnimationActive={false}>
          <LabelList dataKey="dose" position="top" fill="var(--ink)" fontSize={13} />
        </Bar>
      </BarChart>
    </ResponsiveContainer>
  );
}
