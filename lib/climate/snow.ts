/** Share of light that bare ground and grass reflect: the usual value where nothing is known, Liu & Jordan (1963), Solar Energy 7:53, from memory. */
export const bareGroundAlbedo = 0.2;
/** Of a snow cover that is neither fresh nor old: published values run from about 0.4 (old) to 0.8 (fresh), from memory. */
const snowAlbedo = 0.6;
/** Monthly mean temperature, °C, from which on no snow is counted, and at which the ground is always white. Our rule. */
const noSnowC = 0;
const whiteC = -6;

/**
 * Share of light that the ground of a home reflects, by month, 0.2–0.6.
 * Our rule: 0.2 in months with a mean of 0 °C or more, rising in a straight line to 0.6 at −6 °C and below. How much snow lies is not known.
 * @param meanC monthly mean temperatures at the home, °C, January first
 * @example groundAlbedo([-9, -3, 0, 12]) // 0.6, 0.4, 0.2, 0.2
 */
export const groundAlbedo = (meanC: readonly number[]): number[] =>
  meanC.map((celsius) => {
    const white = Math.min(1, Math.max(0, (noSnowC - celsius) / (noSnowC - whiteC)));
    return bareGroundAlbedo + white * (snowAlbedo - bareGroundAlbedo);
  });
