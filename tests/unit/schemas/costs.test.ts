import { describe, expect, test } from 'vitest';
import { exampleCosts } from '@/lib/care/costs';
import { costsForm, costsSchema } from '@/lib/schemas/costs';

const form = { homeId: 'h1', units: 'us', doer: 'hired', trip: '$1,250', restain: '2.50', strip: '5', recaulk: '.75', wash: '0' };
const faults = (values: Record<string, string>) => {
  const read = costsSchema.safeParse({ ...form, ...values });
  return read.success ? [] : read.error.issues.map(({ path, message }) => [path.join('.'), message]);
};

describe('prices as typed', () => {
  // 1 m² is 10.7639 ft², 1 m is 3.28084 ft (international foot).
  test('dollars per ft² and per ft come out as cents per m² and per m', () => {
    const { costs } = costsSchema.parse(form);
    expect(costs).toMatchObject({ doer: 'hired', tripCents: 125_000, washCentsPerM2: 0 });
    expect(costs.restainCentsPerM2).toBeCloseTo(250 * 10.7639, 1);
    expect(costs.stripCentsPerM2).toBeCloseTo(500 * 10.7639, 1);
    expect(costs.recaulkCentsPerM).toBeCloseTo(75 * 3.28084, 2);
  });

  test('in metric they are what they say', () => {
    expect(costsSchema.parse({ ...form, units: 'metric' }).costs).toMatchObject({ restainCentsPerM2: 250, recaulkCentsPerM: 75 });
  });

  test('what is missing, cannot be read or is out of bounds is said at its field', () => {
    expect(faults({ trip: '' })).toEqual([['trip', '“One trip” is missing. Write 0 if it costs nothing.']]);
    expect(faults({ wash: '-1', strip: 'much' }).map(([path]) => path)).toEqual(['strip', 'wash']);
    expect(faults({ recaulk: '1000.01' })).toEqual([['recaulk', 'This should be at most $1,000.']]);
    expect(faults({ doer: 'nobody' })).toEqual([['doer', 'Choose who does the work.']]);
  });

  test.each(['us', 'metric'] as const)('the form shows stored prices so that sending them back moves none by more than half a tenth of a cent: %s', (units) => {
    for (const costs of Object.values(exampleCosts)) {
      const { costs: back } = costsSchema.parse({ homeId: 'h1', units, ...costsForm(costs, units) });
      expect(back.tripCents).toBe(costs.tripCents);
      for (const name of ['restainCentsPerM2', 'stripCentsPerM2', 'washCentsPerM2'] as const) expect(Math.abs(back[name] - costs[name])).toBeLessThanOrEqual(0.05 * 10.7639 + 1e-9);
      expect(Math.abs(back.recaulkCentsPerM - costs.recaulkCentsPerM)).toBeLessThanOrEqual(0.05 * 3.28084 + 1e-9);
    }
  });

  test('prices are shown without needless digits', () => {
    expect(costsForm(exampleCosts.self, 'metric')).toEqual({ doer: 'self', trip: '90', restain: '5.50', strip: '14', recaulk: '1.30', wash: '0.60' });
    // 550 cents a square meter are 51.1 cents a square foot.
    expect(costsForm(exampleCosts.self, 'us')).toMatchObject({ restain: '0.511', wash: '0.056' });
  });
});
