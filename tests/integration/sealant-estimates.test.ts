import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import { POST } from '@/app/api/estimates/sealant/route';
import { type SealantAnswer } from '@/lib/takeoff/sealant-need';
import { litresPerGallon, metresToFeet } from '@/lib/units';
import { setEnvironment } from '@/tests/fixtures/environment';
import { postJson } from '@/tests/fixtures/post-json';

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(null) }));
setEnvironment();

type Problem = { status: number; title: string; errors?: Record<string, string> };

const ask = (body: unknown) => postJson(POST, body);

const wall = { widthFt: 30, heightFt: 9, openings: [{ widthFt: 3, heightFt: 4, count: 3 }] };

describe('POST /api/estimates/sealant', () => {
  // By hand: 42 ft round windows, 18 ft of corners, 17 courses × 1 joint × 6.625 in = 9.385 ft, 4 pipes of a foot.
  test('a wall of 30 ft × 9 ft with three windows and four pipes: 73.4 ft', async () => {
    const { status, json } = await ask({ walls: [wall], penetrations: { count: 4 } });
    expect(status).toBe(200);
    expect(metresToFeet((json as SealantAnswer).lengthM)).toBeCloseTo(73.385, 3);
  });

  // sealant-yield.csv: 10.1 fl oz fill 24.3 ft of 1/4 × 1/4 in.
  test('24.3 ft of 1/4 × 1/4 in are one container of 10.1 fl oz', async () => {
    const { json } = await ask({ lengthFt: 24.3, jointWidthIn: 0.25, wastePercent: 0, containers: [{ floz: 10.1, priceCents: 900 }] });
    expect(json).toMatchObject({ containers: [{ count: 1 }], priceCents: 900 });
  });

  test('the words in millimetres when asked', async () => {
    const { json } = await ask({ units: 'metric', lengthFt: 100, jointWidthIn: 0.5 });
    expect((json as SealantAnswer).explanations.depth.value).toBe('12.7 mm');
  });

  test.each([
    [{}, 'walls'],
    [{ walls: [wall], lengthFt: 10 }, 'walls'],
    [{ walls: [] }, 'walls'],
    [{ walls: [{ widthFt: -1, heightFt: 9 }] }, 'walls.0.widthFt'],
    [{ lengthFt: 10, jointWidthIn: 0.2 }, 'jointWidthIn'],
    [{ lengthFt: 10, jointWidthIn: 1.5 }, 'jointWidthIn'],
    [{ lengthFt: 10, nominalIn: 7 }, 'nominalIn'],
    [{ lengthFt: 10, boardFt: 0 }, 'boardFt'],
    [{ lengthFt: 10, corners: 3 }, 'corners'],
    [{ lengthFt: 10, penetrations: 4 }, 'penetrations'],
    [{ lengthFt: 10, penetrations: { count: 1.5 } }, 'penetrations.count'],
    [{ lengthFt: 10, wastePercent: 51 }, 'wastePercent'],
    [{ lengthFt: 10, containers: [] }, 'containers'],
    [{ lengthFt: 10, containers: [{ floz: 0, priceCents: 1 }] }, 'containers.0.floz'],
    [{ lengthFt: 10, units: 'furlongs' }, 'units'],
    [{ walls: Array.from({ length: 10_000 }, () => ({})) }, 'walls'],
    [null, ''],
    [[], ''],
  ])('%j is a 422 problem at %s', async (body, field) => {
    const { status, type, json } = await ask(body);
    expect([status, type]).toEqual([422, 'application/problem+json']);
    expect(Object.keys((json as Problem).errors ?? {})).toContain(field);
  });

  test('text that is not JSON is a 400, a body past the limit a 413', async () => {
    expect((await ask('{')).status).toBe(400);
    expect((await ask(`"${'x'.repeat(200_001)}"`)).status).toBe(413);
  });

  test('whatever lies within the bounds is an estimate whose containers hold it', async () => {
    const real = (min: number, max: number) => fc.oneof(fc.constantFrom(min, max), fc.double({ min, max, noNaN: true }));
    const body = fc.record(
      {
        lengthFt: real(0, 100_000),
        jointWidthIn: real(0.25, 1),
        wastePercent: real(0, 50),
        containers: fc.array(fc.record({ floz: real(1, 64), priceCents: fc.integer({ min: 0, max: 10_000_000 }) }), { minLength: 1, maxLength: 12 }),
      },
      { requiredKeys: ['lengthFt'] },
    );
    await fc.assert(
      fc.asyncProperty(body, async (sent) => {
        const { status, json } = await ask(sent);
        const { lowL, highL, buyL, containers } = json as SealantAnswer;
        expect([status, lowL <= highL, highL <= buyL]).toEqual([200, true, true]);
        // Amounts are whole tenths of a fluid ounce when containers are chosen.
        expect(containers.reduce((sum, { gal, count }) => sum + gal * count, 0)).toBeGreaterThanOrEqual(buyL / litresPerGallon - 1e-6);
      }),
      { numRuns: 40 },
    );
  });

  test('whatever is sent, the answer is an estimate or a problem, never a fault', async () => {
    const number = fc.oneof(fc.double(), fc.integer(), fc.constantFrom(0, -0, 1e308, -1, 1e-300, 0.25, 30));
    const shaped = fc.record(
      {
        walls: fc.array(fc.record({ widthFt: number, heightFt: number, gableHeightFt: number, openings: fc.array(fc.record({ widthFt: number, heightFt: number, count: number }), { maxLength: 3 }) }, { requiredKeys: [] }), { maxLength: 3 }),
        lengthFt: number,
        jointWidthIn: number,
        nominalIn: fc.constantFrom(6, 8, 10, 7),
        boardFt: number,
        corners: number,
        penetrations: fc.record({ count: number, perimeterIn: number }),
        wastePercent: number,
        containers: fc.array(fc.record({ floz: number, priceCents: number }), { maxLength: 4 }),
      },
      { requiredKeys: [] },
    );
    await fc.assert(
      fc.asyncProperty(fc.oneof(fc.json(), shaped.map((value) => JSON.stringify(value)), fc.string()), async (body) => {
        expect([200, 400, 422]).toContain((await ask(body)).status);
      }),
      { numRuns: 300 },
    );
  });
});
