/** Trees carry leaves in months with a mean of at least this, °C. Our rule. */
const leafC = 10;

/**
 * In which months, January first, trees carry leaves. Our rule: where the monthly mean temperatures are known, those of at least 10 °C;
 * where they are not, May to October north of the equator and November to April south of it.
 * @param latitude degrees north
 * @param meanC twelve monthly mean temperatures, °C
 */
export function leafOnMonths(latitude: number, meanC?: readonly number[]): boolean[] {
  if (meanC) return meanC.map((celsius) => celsius >= leafC);
  return Array.from({ length: 12 }, (_, month) => (month >= 4 && month <= 9) === latitude >= 0);
}
