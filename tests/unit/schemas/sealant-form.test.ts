import { describe, expect, test } from 'vitest';
import { caulkStart } from '@/lib/home/caulk-start';
import { answerCaulk, readCaulk } from '@/lib/schemas/sealant-form';
import { metresToFeet } from '@/lib/units';

const foot = 0.3048;
const front = { wall: { id: 'a', name: 'Front', widthM: 30 * foot, heightM: 9 * foot, gableHeightM: 0 }, openings: [{ widthM: 3 * foot, heightM: 4 * foot, count: 3 }] };
const side = { wall: { id: 'b', name: 'Side', widthM: 16 * foot, heightM: 9 * foot, gableHeightM: 0 }, openings: [] };
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
    expect(readCaulk({ ...start, caulkWalls: [] }, ask)).toEqual({ body: null, faults: {} });
  });
});
