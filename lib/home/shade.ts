import { type Shade } from '@/lib/schemas/vocabulary';
import { type Obstruction } from '@/lib/sun';

/**
 * How much direct light passes each kind of shade, 0–1.
 * Leafy crowns pass roughly a fifth in leaf and two thirds bare, evergreens roughly a fifth all year: from memory, medium confidence; our rule.
 */
const passes: Record<Exclude<Shade, 'open'>, { leafOn: number; leafOff: number }> = {
  trees: { leafOn: 0.2, leafOff: 0.65 },
  evergreens: { leafOn: 0.2, leafOff: 0.2 },
  building: { leafOn: 0, leafOff: 0 },
};

/** What stands in front of a wall hides the sky this far to each side of its normal, degrees. Our rule. */
const halfWidthDeg = 60;

/**
 * The horizon in front of a wall from the owner's one answer: what stands there and how high (degrees above the horizon, 0–80,
 * seen from the wall's middle). Empty for an open sky. Azimuths clockwise from true north, 0–360.
 */
export function shadeHorizon(wall: { azimuthDeg: number; shade: Shade; shadeHeightDeg: number }): Obstruction[] {
  if (wall.shade === 'open' || wall.shadeHeightDeg <= 0) return [];
  const { leafOn, leafOff } = passes[wall.shade];
  return [
    {
      fromAzimuthDeg: (wall.azimuthDeg - halfWidthDeg + 360) % 360,
      toAzimuthDeg: (wall.azimuthDeg + halfWidthDeg) % 360,
      elevationDeg: wall.shadeHeightDeg,
      transmittanceLeafOn: leafOn,
      transmittanceLeafOff: leafOff,
    },
  ];
}
