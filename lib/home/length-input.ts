import { type UnitSystem } from '@/lib/schemas/vocabulary';

const metresPerInch = 0.0254;
const plain = (value: number, decimals: number) => String(Number(value.toFixed(decimals)));

/**
 * A stored length (m) as its form shows it, so that reading the form again gives the same length:
 * '30', '6 ft 8 in', '29.8556' in feet; '9.1' in metres. Whole inches are written as people do.
 */
export function lengthInput(metres: number, units: UnitSystem, decimals = 4): string {
  if (units === 'metric') return plain(metres, Math.min(decimals, 3));
  const inches = metres / metresPerInch;
  const whole = Math.round(inches);
  if (Math.abs(inches - whole) > 0.001) return plain(inches / 12, decimals);
  const [feet, rest] = [Math.floor(whole / 12), whole % 12];
  if (rest === 0) return String(feet);
  return feet === 0 ? `${rest} in` : `${feet} ft ${rest} in`;
}
