import { type Source } from '@/lib/explain';
import { ourRule } from '@/lib/our-rules';
import { type StainBase } from '@/lib/schemas/vocabulary';
import { fahrenheitToCelsius } from '@/lib/units';

/** Limits for a day of work. °C, hours, percent. The label of the product wins over every one. */

const handbook = (text: string): Source => ({ text: `Wood Handbook, FPL-GTR-190 (2010), ${text}`, ground: 'published' });

export const coldest: Record<StainBase, { celsius: number; source: Source }> = {
  waterborne: { celsius: fahrenheitToCelsius(50), source: handbook('p. 16-23: latex and waterborne finishes at 50 °F or warmer') },
  oil: { celsius: fahrenheitToCelsius(40), source: handbook('p. 16-23: oil and alkyd finishes at 40 °F or warmer') },
};

/** A morning this little under the limit may still warm up to it, °C. Our rule. */
export const mayWarmUpC = 5;

export const hottestForStain = { celsius: fahrenheitToCelsius(90), source: ourRule('stain in heat') };

export const nightForStain: Record<StainBase, { celsius: number; source: Source; short: 'no' | 'wait' }> = {
  waterborne: { celsius: coldest.waterborne.celsius, short: 'no', source: handbook('p. 16-23: and expected to stay above 50 °F for 24 hours') },
  oil: { celsius: coldest.oil.celsius, short: 'wait', source: ourRule('oil at night') },
};

/** Without a forecast the dew point stands for the night's low. */
export const dewPointForNight = handbook('p. 16-23: the dew point is a good estimate of the night’s low');

export const forSealant = {
  coldestC: fahrenheitToCelsius(40),
  hottestC: fahrenheitToCelsius(100),
  source: { text: 'ASTM C1193: sealant at 40 to 100 °F, the joint dry and free of frost', ground: 'memory' } satisfies Source,
  nightC: 0,
  night: ourRule('caulk at night'),
};

/** The wall taken to be as warm as the air. */
export const aboveDewPoint = {
  kelvin: 3,
  source: { text: 'ISO 8502-4: a surface to be coated stands 3 °C (5 °F) above the dew point. Written for steel; taken over for wood', ground: 'memory' } satisfies Source,
};

export const woodMoisture = {
  percent: 20,
  source: { text: 'Wood Handbook, FPL-GTR-190 (2010), ch. 16: finish wood below 20 % moisture', ground: 'memory' } satisfies Source,
  forJoint: ourRule('dry joint'),
};

export const dryBefore = { hours: 24, source: ourRule('dry before') };
export const dryAfter = { hours: 24, atLeastHours: 4, source: ourRule('dry after') };

export const sunOnWall: Record<StainBase, Source> = {
  oil: handbook('p. 16-23: no oil or alkyd on a surface hot in the sun, nor on a cool one that the sun will heat within a few hours: it blisters'),
  waterborne: handbook('p. 16-20: follow the shade around the house, so that edges stay wet and no laps show'),
};
