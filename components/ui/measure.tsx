import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { areaText, distanceText, lengthText, smallLengthText, temperatureText, volumeText } from '@/lib/units';

const texts = { length: lengthText, 'small length': smallLengthText, area: areaText, volume: volumeText, temperature: temperatureText, distance: distanceText } as const;

type MeasureProps = {
  kind: keyof typeof texts;
  /** In SI: m, m², L, °C; distances in km. */
  value: number;
  units: UnitSystem;
};

/** A measure in the reader's units; number and unit never part. */
export function Measure({ kind, value, units }: MeasureProps) {
  return <span className="whitespace-nowrap tabular-nums">{texts[kind](value, units)}</span>;
}

const dollars = (cents: number, digits: number) => (cents / 100).toLocaleString('en-US', { style: 'currency', currency: 'USD', minimumFractionDigits: digits, maximumFractionDigits: digits });

/** An amount of money in cents: '$1,250', '$4.50'. */
export function Money({ cents }: { cents: number }) {
  return <span className="whitespace-nowrap tabular-nums">{dollars(cents, cents % 100 === 0 ? 0 : 2)}</span>;
}
