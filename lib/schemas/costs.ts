import { z } from 'zod';
import { type WorkCosts } from '@/lib/care/costs';
import { choice } from '@/lib/schemas/measures';
import { homeTarget } from '@/lib/schemas/targets';
import { type Doer, doers, keysOf, unitSystems, type UnitSystem } from '@/lib/schemas/vocabulary';
import { metresPerFoot, squareMetresPerSquareFoot } from '@/lib/units';

/** The prices of the form: what each is called, and by what it is counted. */
export const priceFields = {
  trip: { label: 'One trip', per: 'trip' },
  restain: { label: 'Restain: wash and one maintenance coat', per: 'area' },
  strip: { label: 'Strip first, on top of the restain', per: 'area' },
  recaulk: { label: 'Recaulk', per: 'length' },
  wash: { label: 'Yearly wash', per: 'area' },
} as const;
export type PriceField = keyof typeof priceFields;

/** Most that one of them may be, in dollars. Our rule: more is a slip of the finger. */
const most = { trip: 20_000, area: 1000, length: 1000 } as const;

const perUnit = (per: 'trip' | 'area' | 'length', units: UnitSystem) => (per === 'trip' || units === 'metric' ? 1 : per === 'area' ? squareMetresPerSquareFoot : metresPerFoot);

/** 'per ft²', 'per m'; empty for a trip. */
export const perWords = (field: PriceField, units: UnitSystem): string => {
  const { per } = priceFields[field];
  return per === 'trip' ? '' : per === 'area' ? (units === 'us' ? 'per ft²' : 'per m²') : units === 'us' ? 'per ft' : 'per m';
};

/** A stored price (cents per m², per m, or a trip) as the form shows it: '0.511', '90', '4.50'. */
export function priceText(cents: number, field: PriceField, units: UnitSystem): string {
  const dollars = (cents / 100) * perUnit(priceFields[field].per, units);
  const text = dollars.toFixed(3).replace(/0$/, '');
  return text.replace(/\.00$/, '');
}

export type CostsForm = { doer: Doer } & Record<PriceField, string>;

/** Costs as the form shows them, in the reader's units. */
export const costsForm = (costs: WorkCosts, units: UnitSystem): CostsForm => ({
  doer: costs.doer,
  trip: priceText(costs.tripCents, 'trip', units),
  restain: priceText(costs.restainCentsPerM2, 'restain', units),
  strip: priceText(costs.stripCentsPerM2, 'strip', units),
  recaulk: priceText(costs.recaulkCentsPerM, 'recaulk', units),
  wash: priceText(costs.washCentsPerM2, 'wash', units),
});

const typed = z.string().optional();
const fields = homeTarget.extend({ units: z.enum(keysOf(unitSystems)), doer: choice(keysOf(doers), 'who does the work'), trip: typed, restain: typed, strip: typed, recaulk: typed, wash: typed });

/** Prices as typed, in dollars and the reader's units; out come cents per m² and m. Every fault stands at its field. */
export const costsSchema = fields.transform(({ homeId, units, doer, ...prices }, ctx) => {
  const cents = (field: PriceField): number => {
    const { per, label } = priceFields[field];
    const plain = (prices[field] ?? '').replace(/[$,\s]/g, '');
    const dollars = /^(\d{1,6}(\.\d{1,4})?|\.\d{1,4})$/.test(plain) ? Number(plain) : null;
    const fault = (message: string) => {
      ctx.addIssue({ code: 'custom', path: [field], message });
      return 0;
    };
    if (dollars === null) return fault(plain === '' ? `“${label}” is missing. Write 0 if it costs nothing.` : 'This could not be read: write it like 2.50.');
    if (dollars > most[per]) return fault(`This should be at most $${most[per].toLocaleString('en-US')}.`);
    return (dollars * 100) / perUnit(per, units);
  };
  const costs: WorkCosts = {
    doer,
    tripCents: Math.round(cents('trip')),
    restainCentsPerM2: cents('restain'),
    stripCentsPerM2: cents('strip'),
    recaulkCentsPerM: cents('recaulk'),
    washCentsPerM2: cents('wash'),
  };
  return { homeId, costs };
});
