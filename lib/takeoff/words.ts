import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { litresPerGallon, volumeText } from '@/lib/units';
import { type ContainerCount } from './containers';

const names: Record<string, string> = { '0.25': '1 qt', '1': '1 gal', '5': '5 gal' };

/** A container by its size: '1 qt', '5 gal', '3.8 L'. */
export const containerText = (gal: number, units: UnitSystem): string => (units === 'us' ? names[String(gal)] : undefined) ?? volumeText(gal * litresPerGallon, units);

/** '5 × 5 gal, 3 × 1 gal and 2 × 1 qt' in the reader's units. */
export function containersText(containers: readonly ContainerCount[], units: UnitSystem): string {
  const parts = containers.map(({ gal, count }) => `${count} × ${containerText(gal, units)}`);
  const last = parts.pop() ?? 'nothing';
  return parts.length > 0 ? `${parts.join(', ')} and ${last}` : last;
}
