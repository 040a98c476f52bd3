import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** Eaves as houses commonly have them. Our own choice. */
export const eavePresets = (units: UnitSystem) =>
  units === 'us'
    ? [{ label: 'None', value: '0' }, { label: '1 ft', value: '1' }, { label: '18 in', value: '1 ft 6 in' }, { label: '2 ft', value: '2' }, { label: 'Porch, 8 ft', value: '8' }]
    : [{ label: 'None', value: '0' }, { label: '30 cm', value: '0.3' }, { label: '45 cm', value: '0.45' }, { label: '60 cm', value: '0.6' }, { label: 'Porch, 2.4 m', value: '2.4' }];
