'use client';

import { Bar, BarChart, CartesianGrid, LabelList, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import { dollarWords } from '@/lib/money';

type YearsAheadBarsProps = { years: readonly { year: number; cents: number }[] };

const words = (dollars: number) => (dollars > 0 ? dollarWords(dollars * 100) : '');

/** Kept in a file of its own: it brings the chart library, which loads only when it is shown. */
export default function YearsAheadBars({ years }: YearsAheadBarsProps) {
  const data = years.map(({ year, cents }) => ({ year, dollars: Math.round(cents / 100) }));
  return (
    <ResponsiveContainer width="100%" height="100%">
      <BarChart accessibilityLayer={false} data={data} margin={{ top: 24, right: 4, bottom: 0, left: 0 }} barCategoryGap="14%">
        <CartesianGrid vertical={false} stroke="var(--line)" />
        <XAxis dataKey="year" tickFormatter={(year: number) => `’${String(year).slice(2)}`} interval="preserveStart" minTickGap={10} tickLine={false} stroke="var(--ink)" tick={{ fill: 'var(--ink)', fontSize: 14 }} />
        <YAxis tickFormatter={words} tickLine={false} axisLine={false} tick={{ fill: 'var(--quiet)', fontSize: 13 }} width={56} />
        <Bar dataKey="dollars" fill="var(--dose-3)" stroke="var(--ink)" strokeWidth={1.5} isAnimationActive={false}>
          <LabelList dataKey="dollars" position="top" fill="var(--ink)" fontSize={12} formatter={(value) => words(Number(value))} className="max-md:hidden" />
        </Bar>
      </BarChart>
    </ResponsiveContainer>
  );
}
