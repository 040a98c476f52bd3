/** Bounds of the sun-dose ramp, kWh/m² a year: 250 to 1350 in five equal steps. Our rule. */
export const doseBounds = [250, 470, 690, 910, 1130, 1350] as const;

export type DoseClass = 1 | 2 | 3 | 4 | 5;

export const doseWords: Record<DoseClass, string> = { 1: 'very little sun', 2: 'little sun', 3: 'medium sun', 4: 'much sun', 5: 'very much sun' };

/** Class 1 to 5 of a wall's yearly sun dose, kWh/m²; doses beyond the ramp take its ends. Example: 1000 is class 4. */
export function doseClass(doseKwhM2: number): DoseClass {
  const step = Math.floor((doseKwhM2 - doseBounds[0]) / 220) + 1;
  return Math.min(5, Math.max(1, step)) as DoseClass;
}
