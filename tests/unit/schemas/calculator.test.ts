import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type FormValue, type FormValues } from '@/lib/schemas/action-state';
import { readCalculator } from '@/lib/schemas/calculator';
import { calculatorStart, editCalculator, exampleWalls, rowsOf, typedIn } from '@/lib/schemas/calculator-values';
import { notCounted } from '@/lib/schemas/calculator-words';
import { estimateSchema } from '@/lib/schemas/estimate';
import { readForm } from '@/lib/schemas/form-values';
import { answerForm } from '@/lib/takeoff/form-answer';

const wall = (values: FormValues = {}): FormValues => ({ width: '30', height: '9', gable: '', openings: { 0: { width: '3', height: '4', count: '3' } }, ...values });
const form = (values: FormValues = {}, units: 'us' | 'metric' = 'us') => calculatorStart({ walls: { 0: wall() }, ...values }, units);
const areaFt2 = (values: FormValues) => answerForm(values)?.areaFt2;

describe('what is typed', () => {
  test('a wall of 30 ft × 9 ft less three windows of 3 ft × 4 ft is 234 ft²', () => {
    expect(areaFt2(form())).toBeCloseTo(234, 9);
    expect(areaFt2(form({ walls: { 0: wall({ width: "30'", height: '8 ft 12 in' }) } }))).toBeCloseTo(234, 9);
    expect(areaFt2(form({ walls: { 0: wall({ gable: '4' }), 7: wall() } }))).toBeCloseTo(234 * 2 + 60, 9);
  });

  // 1 ft is 0.3048 m, 1 US gallon 3.785411784 L exactly (NIST Handbook 44, appendix C).
  test('is the same in metres: 9.144 m × 2.7432 m, coverage 4.9 m²/L is 200 ft²/gal', () => {
    const metric = form({ walls: { 0: { width: '9.144', height: '274.32 cm', openings: { 0: { width: '0.9144', height: '1,2192', count: '3' } } } }, crown: '2.54', coverageLow: String((200 * 0.3048 ** 2) / 3.785411784) }, 'metric');
    expect(areaFt2(metric)).toBeCloseTo(234, 9);
    expect(readCalculator(metric).body).toMatchObject({ units: 'metric', profile: { nominalIn: 8 }, coverageFt2PerGal: { low: expect.closeTo(200, 9) as number, high: expect.closeTo(200, 9) as number } });
    expect(answerForm(metric)?.profileFactor).toBeCloseTo(1.0597, 4);
  });

  test('a price may carry a dollar sign and thousands, a comma may be a point', () => {
    const { body } = readCalculator(form({ containers: { 0: { size: '5', price: '$1,250.50' }, 1: { size: '0,25', price: '24' } } }));
    expect(body?.containers).toEqual([{ gal: 5, priceCents: 125050 }, { gal: 0.25, priceCents: 2400 }]);
  });

  test('one figure on the label is both ends of the range', () => {
    expect(readCalculator(form({ coverageLow: '250' })).body?.coverageFt2PerGal).toEqual({ low: 250, high: 250 });
    expect(readCalculator(form({ coverageLow: '150', coverageHigh: '250' })).body?.coverageFt2PerGal).toEqual({ low: 150, high: 250 });
  });

  test('the chosen walls of a home count by their areas', () => {
    expect(readCalculator(form({ walls: {}, chosenM2: ['24.5#a', '10#b'] })).body).toMatchObject({ areaM2: 34.5 });
    expect(readCalculator(form({ walls: {}, chosenM2: [] })).body).toBeNull();
    expect(readCalculator(form({ walls: {}, chosenM2: ['many#a'] })).faults).toHaveProperty('chosenM2');
  });
});

describe('faults stand at their fields', () => {
  test.each<[FormValues, string]>([
    [{ walls: { 0: wall({ width: 'wide' }) } }, 'walls.0.width'],
    [{ walls: { 3: wall({ height: '90' }) } }, 'walls.3.height'],
    [{ walls: { 0: wall({ gable: '-1' }) } }, 'walls.0.gable'],
    [{ walls: { 0: wall({ width: '3', height: '3' }) } }, 'walls.0.openings'],
    [{ walls: { 0: wall({ openings: { 2: { width: 'x', height: '4', count: '' } } }) } }, 'walls.0.openings.2.width'],
    [{ walls: { 0: wall({ openings: { 2: { width: '3', height: '4', count: '0' } } }) } }, 'walls.0.openings.2.count'],
    [{ crown: '3.4' }, 'crown'],
    [{ siding: '6', crown: '2.5' }, 'crown'],
    [{ waste: '51' }, 'waste'],
    [{ waste: '1e1' }, 'waste'],
    [{ texture: 'glass' }, 'texture'],
    [{ coats: '4' }, 'coats'],
    [{ coverageLow: '10' }, 'coverageLow'],
    [{ coverageLow: '300', coverageHigh: '200' }, 'coverageHigh'],
    [{ containers: { 1: { size: '99', price: '5' } } }, 'containers.1.size'],
    [{ containers: { 1: { size: '5', price: 'dear' } } }, 'containers.1.price'],
    [{ containers: { 1: { size: '', price: '' } } }, 'containers.1.size'],
  ])('%j: %s', (values, field) => {
    const { body, faults } = readCalculator(form(values));
    expect([body, Object.keys(faults)]).toEqual([null, [field]]);
  });

  test('bounds are said in the units of the form', () => {
    expect(readCalculator(form({ crown: '9' }, 'metric')).faults.crown).toBe('The crown should be a number from 0 to 8.41 cm.');
    expect(readCalculator(form({ coverageLow: '900' }, 'metric')).faults.coverageLow).toBe('Coverage should be a number from 0.491 to 49.1 m²/L.');
  });

  test('a begun row lacks what is not there yet; the rest counts without it', () => {
    const values = form({ walls: { 0: wall(), 4: wall({ height: '', openings: { 6: { width: '', height: '3', count: '' } } }) }, containers: { 0: { size: '1', price: '' }, 1: { size: '5', price: '100' } } });
    const { faults, missing } = readCalculator(values);
    expect(faults).toEqual({});
    expect(Object.keys(missing)).toEqual(['walls.4.openings.6.width', 'walls.4.height', 'containers.0.price']);
    expect(areaFt2(values)).toBeCloseTo(234, 9);
    expect(notCounted(values, missing)).toEqual([
      'Opening 1 of wall 2 does not count yet. The width is still missing.',
      'Wall 2 does not count yet. The height is still missing.',
      'Container 1 does not count yet. The price is still missing.',
    ]);
  });
});

const typedText = fc.constantFrom('', '1', '30', '9.5', "30' 6\"", '2 m', '-3', 'x', '1e9', '99999', '0', '2,5');
const row = (fields: string[]) => fc.record(Object.fromEntries(fields.map((name) => [name, typedText])));
const typedForm = fc.record({
  units: fc.constantFrom('us', 'metric'),
  walls: fc.dictionary(fc.constantFrom('0', '1', '12'), fc.tuple(row(['width', 'height', 'gable']), fc.dictionary(fc.constantFrom('0', '3'), row(['width', 'height', 'count']))).map(([sizes, openings]) => ({ ...sizes, openings }))),
  containers: fc.dictionary(fc.constantFrom('0', '1'), row(['size', 'price'])),
  crown: typedText, coverageLow: typedText, coverageHigh: typedText, waste: typedText,
  siding: fc.constantFrom('6', '8', '10', '7'), texture: fc.constantFrom('smooth', 'saw-textured'), coats: fc.constantFrom('1', '2', '3'),
}) as fc.Arbitrary<FormValues>;

describe('whatever is typed or sent', () => {
  test('the form is an estimate that the handler takes, or says at a field what is wrong, or is empty', () => {
    fc.assert(
      fc.property(typedForm, (sent) => {
        const { body, faults, missing } = readCalculator(calculatorStart(sent, sent.units === 'metric' ? 'metric' : 'us'));
        if (body) expect([estimateSchema.safeParse(body).success, faults]).toEqual([true, {}]);
        for (const name of [...Object.keys(faults), ...Object.keys(missing)]) expect(name).toMatch(/^(walls\.\d+\.|containers\.\d+\.|crown|coverage|waste|$)/);
      }),
      { numRuns: 500 },
    );
  });

  test('a query of any shape becomes a form with every field', () => {
    const junk: fc.Arbitrary<FormValue> = fc.letrec((tie) => ({ value: fc.oneof({ depthSize: 'small' }, fc.string(), fc.array(fc.string()), fc.dictionary(fc.oneof(fc.string(), fc.constantFrom('0', 'openings', 'width', '__proto__')), tie('value'))) })).value as fc.Arbitrary<FormValue>;
    const names = fc.oneof(fc.constantFrom('walls', 'containers', 'crown', 'chosenM2', 'units', 'texture', 'edit'), fc.string());
    fc.assert(
      fc.property(fc.dictionary(names, junk), (sent) => {
        const start = calculatorStart(sent, 'us');
        expect(rowsOf(start, 'walls').length).toBeGreaterThan(0);
        expect(typeof start.crown).toBe('string');
        expect(calculatorStart(start, 'us')).toEqual(start);
        readCalculator(start);
      }),
    );
  });

  test('an edit that the form does not know changes nothing', () => {
    const edits = fc.oneof(fc.string(), fc.constantFrom('add __proto__', 'add walls.0', 'add waste', 'add walls.0.openings.0', 'drop walls', 'drop containers', 'drop units', 'drop walls.0.openings', 'to furlongs', 'walls', 'add'));
    fc.assert(fc.property(edits, (edit) => void expect(editCalculator(form(), edit)).toEqual(form())));
  });
});

describe('the buttons of the form', () => {
  test('add and remove walls, openings and containers', () => {
    const two = editCalculator(form(), 'add walls');
    expect(rowsOf(two, 'walls').map(([key]) => key)).toEqual(['0', '1']);
    expect(areaFt2(two)).toBeCloseTo(234, 9);
    expect(rowsOf(editCalculator(two, 'add walls.1.openings'), 'walls.1.openings')).toHaveLength(1);
    expect(areaFt2(editCalculator(form(), 'drop walls.0.openings.0'))).toBeCloseTo(270, 9);
    expect(rowsOf(editCalculator(two, 'drop walls.0'), 'walls').map(([key]) => key)).toEqual(['1']);
    expect(rowsOf(editCalculator(form(), 'add containers'), 'containers')).toHaveLength(4);
  });

  test('into metres and back keeps what was meant', () => {
    const us = form({ walls: exampleWalls.us, crown: '1', coverageLow: '150', coverageHigh: '250' });
    const metric = editCalculator(us, 'to metric');
    expect(metric).toMatchObject({ units: 'metric', crown: '2.54' });
    expect(typedIn(rowsOf(metric, 'walls')[0]?.[1] ?? {}, 'width')).toBe('9.144');
    // Sizes are shown to a hundredth of a litre and a thousandth of a metre.
    expect(answerForm(metric)?.buyL).toBeCloseTo(answerForm(us)?.buyL ?? NaN, 1);
    expect(answerForm(editCalculator(metric, 'to us'))?.areaFt2).toBeCloseTo(234, 0);
    expect(editCalculator(us, 'to us')).toEqual(us);
    expect(editCalculator(form({ crown: 'x', walls: { 0: wall({ width: 'wide' }) } }), 'to metric')).toMatchObject({ crown: 'x', walls: { 0: { width: 'wide' } } });
  });

  test('the names of its fields are what a browser sends back', () => {
    const sent = new FormData();
    for (const [name, value] of [['units', 'us'], ['walls.0.width', '30'], ['walls.0.height', '9'], ['walls.0.openings.0.width', '3'], ['walls.0.openings.0.height', '4'], ['walls.0.openings.0.count', '3'], ['edit', 'add walls']]) sent.append(name ?? '', value ?? '');
    expect(areaFt2(calculatorStart(readForm(sent), 'us'))).toBeCloseTo(234, 9);
  });
});
