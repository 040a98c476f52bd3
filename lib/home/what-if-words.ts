import { monthsInWords } from '@/lib/coat';
import { type ExplainedInput, type Explanation } from '@/lib/explain';
import { type Change, type CoatCost, type Variant } from '@/lib/home/what-if';
import { ourRule } from '@/lib/our-rules';
import { priceText } from '@/lib/schemas/costs';
import { finishes, textures, type UnitSystem } from '@/lib/schemas/vocabulary';
import { areaText, lengthText } from '@/lib/units';

const dollars = (cents: number) => Math.round(cents / 100);
const money = (amount: number) => `$${amount.toLocaleString('en-US')}`;

/** 'An eave 1 ft deeper', 'Solid-color stain', 'Smooth surface'. */
export function changeWords(change: Change, units: UnitSystem): string {
  if (change.kind === 'eave') return `An eave ${lengthText(change.byM, units)} deeper`;
  return change.kind === 'finish' ? finishes[change.finish] : `${textures[change.texture]} wood`;
}

/** Up to two years in months: '14 months'. */
const differenceWords = (months: number) => (months > 1 && months < 24 ? `${months} months` : monthsInWords(months));

/** '6 years 2 months, 14 months longer'. */
export function lifeWords({ life, longerMonths }: Pick<Variant, 'life' | 'longerMonths'>): string {
  const total = monthsInWords(life.months);
  if (longerMonths === 0) return `${total}, as now`;
  return `${total}, ${differenceWords(Math.abs(longerMonths))} ${longerMonths > 0 ? 'longer' : 'shorter'}`;
}

/** 'As it is: 5 years, $75 a year.' */
export const nowWords = ({ life, centsAYear }: CoatCost): string => `As it is: ${monthsInWords(life.months)}, ${money(dollars(centsAYear))} a year.`;

/** '$62 a year, $13 less', in whole dollars that add up. */
export function costWords({ centsAYear, dearerCents }: Pick<Variant, 'centsAYear' | 'dearerCents'>): string {
  const difference = dollars(centsAYear) - dollars(centsAYear - dearerCents);
  const said = difference === 0 ? 'about as now' : `${money(Math.abs(difference))} ${difference > 0 ? 'more' : 'less'}`;
  return `${money(dollars(centsAYear))} a year, ${said}`;
}

/** What the words and figures need besides the variant. */
export type WhatIfFacts = { now: CoatCost; areaM2: number; restainCentsPerM2: number; pricesSet: boolean; units: UnitSystem };

/** What a wall's page shows of it. */
export type WhatIfView = { facts: WhatIfFacts; variants: Variant[] };

/** How a variant's life and cost came about. */
export function variantExplained(variant: Variant, { now, areaM2, restainCentsPerM2, pricesSet, units }: WhatIfFacts): Explanation {
  const { explanation } = variant.life;
  const priced: ExplainedInput[] = [
    { label: 'Coat life now', value: monthsInWords(now.life.months) },
    { label: 'Wall area', value: areaText(areaM2, units) },
    { label: 'Price of a restain', value: `$${priceText(restainCentsPerM2, 'restain', units)} a ${units === 'us' ? 'ft²' : 'm²'}${pricesSet ? '' : ' (our example)'}` },
    { label: 'Cost a year', value: costWords(variant) },
  ];
  return {
    ...explanation,
    figure: 'Coat life with this change',
    value: lifeWords(variant),
    formula: `${explanation.formula}; cost a year = wall area × price of a restain ÷ coat life in years`,
    inputs: [...explanation.inputs, ...priced],
    sources: [
      ...explanation.sources,
      ourRule('one change'),
      ...(pricesSet ? [] : [ourRule('example prices')]),
    ],
  };
}
