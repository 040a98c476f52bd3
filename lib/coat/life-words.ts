const count = (n: number, unit: string) => `${n} ${unit}${n === 1 ? '' : 's'}`;

/** '4 years 7 months', '3 years', '8 months'. Whole months, at least 1. */
export function monthsInWords(months: number): string {
  const years = Math.floor(months / 12);
  const rest = months % 12;
  if (years === 0) return count(rest, 'month');
  return rest === 0 ? count(years, 'year') : `${count(years, 'year')} ${count(rest, 'month')}`;
}
