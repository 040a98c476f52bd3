import { type UnitSystem } from '@/lib/schemas/vocabulary';
import { litresPerGallon, litresToGallons } from '@/lib/units';
import { type ContainerCount } from './containers';

const number = (value: number, digits: number) => Number(value.toFixed(digits)).toLocaleString('en-US');

/** Caulk comes by the fluid ounce or the millilitre: 31.2 fl oz; 923 mL. */
export const sealantVolumeText = (litres: number, units: UnitSystem): string => (units === 'us' ? `${number(litresToGallons(litres) * 128, 1)} fl oz` : `${number(litres * 1000, 0)} mL`);

/** '10.1 fl oz', '600 mL': a size that is sold by the millilitre is called so in both systems. */
export function sealantContainerText(gal: number, units: UnitSystem): string {
  const litres = gal * litresPerGallon;
  return Math.abs(litres - 0.6) < 1e-6 ? '600 mL' : sealantVolumeText(litres, units);
}

/** '2 × 29 fl oz and 1 × 10.1 fl oz' in the reader's units. */
export const sealantContainersText = (containers: readonly ContainerCount[], units: UnitSystem): string =>
  containers.length === 0 ? 'nothing' : containers.map(({ gal, count }) => `${count} × ${sealantContainerText(gal, units)}`).join(' and ');
