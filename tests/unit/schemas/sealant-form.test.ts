import { describe, expect, test } from 'vitest';
import { caulkStart } from '@/lib/home/caulk-start';
import { rowsOf } from '@/lib/schemas/calculator-values';
import { answerCaulk, notedPipes, readCaulk } from '@/lib/schemas/sealant-form';
import { metresToFeet } from '@/lib/units';

const foot = 0.3048;
const front = { wall: { id: 'a', name: 'Front', widthM: 30 * foot, heightM: 9 * foot, gableHeightM: 0, corners: 2, pipes: 0 }, openings: [{ widthM: 3 * foot, heightM: 4 * foot, count: 3 }] };
const side = { wall: { id: 'b', name: 'Side', widthM: 16 * foot, heightM: 9 * foot, gableHeightM: 0, corners: 2, pipes: 0 }, openings: [] };
const startIn = (units: 'us' | 'metric', next: string[], sent = {}) => caulkStart({ sidingNominalIn: 8 }, [front, side], next, units, sent);

describe('the form of the caulk on a home', () => {
  // By hand: front 42 + 18 + 17 × 6.625/12 = 69.385 ft; side two half corners of two lines, 18 ft, and boards of 16 ft without a joint.
  test('starts with the walls whose recaulk is next, or all of them', () => {
    expect(metresToFeet(startIn('us', ['a']).first?.lengthM ?? NaN)).toBeCloseTo(69.385, 3);
    expect(metresToFeet(startIn('us', []).first?.lengthM ?? NaN)).toBeCloseTo(69.385 + 18, 3);
  });

  test('takes millimetres as it takes inches', () => {
    const { ask, start } = startIn('metric', ['a']);
    expect(answerCaulk(start, ask)?.depthM).toBeCloseTo(0.00635, 9);
    expect(answerCaulk({ ...start, caulkWidth: '12,7' }, ask)?.depthM).toBeCloseTo(0.0127, 9);
  });

  test('what was sent comes back', () => {
    expect(startIn('us', ['a'], { caulkWidth: '0.5', 'caulkWalls[]': 'b' }).start).toMatchObject({ caulkWidth: '0.5', caulkWalls: ['b'] });
  });

  test.each([['caulkWidth', '0.1'], ['caulkWidth', ''], ['pipes', '1.5'], ['caulkWaste', 'much']])('%s of "%s" is a fault at its field', (field, text) => {
    const { ask, start } = startIn('us', ['a']);
    const { body, faults } = readCaulk({ ...start, [field]: text }, ask);
    expect([body, Object.keys(faults)]).toEqual([null, [field]]);
  });

  test('no wall chosen is neither an estimate nor a fault', () => {
    const { ask, start } = startIn('us', ['a']);
    expect(readCaulk({ ...start, caulkWalls: [] }, ask)).toEqual({ body: null, faults: {}, missing: {} });
  });

  // Four pipes are a foot of joint each; without corners the front has 18 ft less (by hand, as above).
  test('the corners and pipes noted for the chosen walls count, until another number of pipes is typed', () => {
    const noted = { ...front, wall: { ...front.wall, corners: 0, pipes: 4 } };
    const { ask, start, first } = caulkStart({ sidingNominalIn: 8 }, [noted, side], ['a'], 'us', {});
    expect(metresToFeet(first?.lengthM ?? NaN)).toBeCloseTo(69.385 - 18 + 4, 3);
    expect(notedPipes(start, ask)).toBe(4);
    expect(metresToFeet(answerCaulk({ ...start, pipes: '1' }, ask)?.lengthM ?? NaN)).toBeCloseTo(69.385 - 18 + 1, 3);
    expect(metresToFeet(answerCaulk({ ...start, pipes: '0' }, ask)?.lengthM ?? NaN)).toBeCloseTo(69.385 - 18, 3);
  });

  const rows = (...sizes: [size: string, price: string][]) => Object.fromEntries(sizes.map(([size, price], key) => [String(key), { size, price }]));

  test('starts with four sizes as their labels say them', () => {
    const sizes = rowsOf(startIn('metric', ['a']).start, 'caulkContainers').map(([, row]) => row.size);
    expect(sizes).toEqual(['10.1 fl oz', '20 fl oz', '600 mL', '29 fl oz']);
  });

  test('sizes are typed as the label says them, and a bare number in the reader’s unit', () => {
    const sent = (units: 'us' | 'metric', size: string) => {
      const { ask, start } = startIn(units, ['a']);
      return readCaulk({ ...start, caulkContainers: rows([size, '9']) }, ask).body?.containers?.[0]?.floz;
    };
    expect([sent('us', '10.1'), sent('metric', '10.1 fl oz'), sent('us', '10.1 FL. OZ.')]).toEqual([10.1, 10.1, 10.1].map((floz) => expect.closeTo(floz, 9)));
    // 29.5735295625 mL to the US fluid ounce (NIST SP 811).
    expect([sent('metric', '600'), sent('us', '600 mL'), sent('us', '600ml')]).toEqual([1, 2, 3].map(() => expect.closeTo(600 / 29.5735295625, 9)));
  });

  test.each([['much', '9', 'size'], ['0.5', '9', 'size'], ['700 fl oz', '9', 'size'], ['10.1', 'free', 'price']])('a container of "%s" at "%s" is a fault at its %s', (size, price, field) => {
    const { ask, start } = startIn('us', ['a']);
    const { body, faults } = readCaulk({ ...start, caulkContainers: rows(['20', '16'], [size, price]) }, ask);
    expect([body, Object.keys(faults)]).toEqual([null, [`caulkContainers.1.${field}`]]);
  });

  test('rows are added and taken away without a script, and what was typed stays', () => {
    const sent = { 'caulkContainers.0.size': '20', 'caulkContainers.0.price': '12', 'caulkContainers.1.size': '29', 'caulkContainers.1.price': '20' };
    expect(startIn('us', ['a'], { ...sent, edit: 'drop caulkContainers.1' }).start.caulkContainers).toEqual(rows(['20', '12']));
    expect(Object.keys(startIn('us', ['a'], { ...sent, edit: 'add caulkContainers' }).start.caulkContainers ?? {})).toEqual(['0', '1', '2']);
  });

  test('a row with a size and no price does not count, and says so', () => {
    const { ask, start } = startIn('us', ['a']);
    const { body, missing } = readCaulk({ ...start, caulkContainers: rows(['20', '16'], ['29', '']) }, ask);
    expect(body?.containers).toHaveLength(1);
    expect(Object.keys(missing)).toEqual(['caulkContainers.1.price']);
  });
});
