/**
 * Feet of joint that one container fills: volume ÷ (width × depth) ÷ 12, without waste. Exact arithmetic.
 * @param jointWidthIn joint width, in
 * @param jointDepthIn depth of the bead, in
 * @param containerVolumeIn3 volume of the container, in³ (a US fluid ounce is 1.8046875 in³)
 * @throws RangeError unless all are > 0
 * @example sealantYieldFt(0.25, 0.25, 10.1 * 1.8046875) // 24.3
 */
export function sealantYieldFt(jointWidthIn: number, jointDepthIn: number, containerVolumeIn3: number): number {
  if (!(jointWidthIn > 0) || !(jointDepthIn > 0) || !(containerVolumeIn3 > 0)) throw new RangeError('joint and container must have a size');
  return containerVolumeIn3 / (jointWidthIn * jointDepthIn) / 12;
}
