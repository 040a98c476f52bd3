/**
 * Magnus's b and c (°C) over water: Alduchov & Eskridge (1996), Journal of Applied Meteorology 35:601–609, eq. 21
 * (from memory; its saturation pressures are within 0.4 % from −40 to 50 °C).
 */
const b = 17.625;
const c = 243.04;

/**
 * The temperature at which the air's water begins to condense, °C: c·γ/(b − γ) with γ = ln(RH/100) + b·T/(c + T).
 * @param celsius air temperature, −40 to 50
 * @param humidityPercent relative humidity over water, above 0 and at most 100
 * @throws RangeError outside of these ranges
 * @example dewPointC(25, 50) // 13.9
 */
export function dewPointC(celsius: number, humidityPercent: number): number {
  if (!(celsius >= -40 && celsius <= 50)) throw new RangeError('air temperature out of range: −40 to 50 °C');
  if (!(humidityPercent > 0 && humidityPercent <= 100)) throw new RangeError('relative humidity out of range: above 0 to 100 %');
  const gamma = Math.log(humidityPercent / 100) + (b * celsius) / (c + celsius);
  return (c * gamma) / (b - gamma);
}
