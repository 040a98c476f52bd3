import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import { POST } from '@/app/api/estimates/stain/route';
import { type StainAnswer } from '@/lib/takeoff/estimate';
import { setEnvironment } from '@/tests/fixtures/environment';
import { postJson } from '@/tests/fixtures/post-json';

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(null) }));
setEnvironment();

type Problem = { status: number; title: string; errors?: Record<string, string> };

const ask = (body: unknown) => postJson(POST, body);

const wall = { widthFt: 30, heightFt: 9, openings: [{ widthFt: 3, heightFt: 4, count: 3 }] };

describe('POST /api/estimates/stain', () => {
  // 234 ft² × 1.0597 × 2 coats at 100–200 ft²/gal (Wood Handbook p. 16-20); 1.0597: exact geometry of 6.625 in by 1 in.
  test('a wall of 30 ft × 9 ft with three windows, rough wood, two coats: 2.48 to 4.96 gal', async () => {
    const { status, json } = await ask({ walls: [wall], profile: { nominalIn: 8 }, texture: 'saw-textured', coats: 2, wastePercent: 0 });
    const answer = json as StainAnswer;
    expect(status).toBe(200);
    expect(answer.areaFt2).toBeCloseTo(234, 9);
    expect(answer.lowGal).toBeCloseTo(2.48, 2);
    expect(answer.highGal).toBeCloseTo(4.96, 2);
    expect(answer.explanation.sources.length).toBeGreaterThan(0);
  });

  test('the label wins over the table, and one area over walls', async () => {
    const { json } = await ask({ areaFt2: 1000, profile: { exposedFaceIn: 8, crownHeightIn: 0 }, texture: 'smooth', coats: 1, wastePercent: 0, coverageFt2PerGal: { low: 250, high: 500 } });
    expect(json).toMatchObject({ lowGal: 2, highGal: 4, buyGal: 4 });
  });

  test('the cheapest cans for the need', async () => {
    const { json } = await ask({ areaFt2: 1500, profile: { exposedFaceIn: 8, crownHeightIn: 0 }, texture: 'smooth', coats: 1, wastePercent: 0, coverageFt2PerGal: { low: 250, high: 250 }, containers: [{ gal: 5, priceCents: 6000 }, { gal: 3, priceCents: 2500 }] });
    expect(json).toMatchObject({ containers: [{ gal: 3, count: 2 }], priceCents: 5000 });
  });

  test('the most that may be asked for is still an estimate', async () => {
    const { status, json } = await ask({ areaFt2: 100_000, profile: { exposedFaceIn: 8, crownHeightIn: 4 }, texture: 'saw-textured', coats: 3, coverageFt2PerGal: { low: 20, high: 20 }, wastePercent: 50 });
    const answer = json as StainAnswer;
    expect(status).toBe(200);
    // 100,000 ft² × π/2 × 3 coats ÷ 20 ft²/gal × 1.5.
    expect(answer.buyGal).toBeCloseTo(11_250 * Math.PI, 4);
    expect(answer.containers.reduce((sum, { gal, count }) => sum + gal * count, 0)).toBeGreaterThanOrEqual(answer.buyGal);
  });

  test('gable and litres: half of width × height, 3.785411784 L to the gallon; the words in metres when asked', async () => {
    const { json } = await ask({ units: 'metric', walls: [{ widthFt: 20, heightFt: 8, gableHeightFt: 6 }], profile: { exposedFaceIn: 8, crownHeightIn: 0 }, texture: 'smooth', coats: 1, wastePercent: 10, coverageFt2PerGal: { low: 220, high: 220 } });
    const answer = json as StainAnswer;
    expect(answer.areaFt2).toBeCloseTo(220, 9);
    expect(answer.buyL).toBeCloseTo(1.1 * 3.785411784, 9);
    expect(answer.lowL).toBeCloseTo(3.785411784, 9);
    expect(answer.explanation.value).toBe('4.2 L');
    expect(answer.explanations.area.inputs).toEqual([{ label: 'Wall 1', value: '6.1 m × 2.44 m + gable 1.83 m = 20.4 m²' }]);
    expect(answer.explanations.containers.inputs.at(-1)).toEqual({ label: 'Left over', value: '0.57 L' });
  });

  test.each([
    [{ texture: 'smooth' }, 'walls'],
    [{ walls: [], texture: 'smooth' }, 'walls'],
    [{ walls: [{ widthFt: -1, heightFt: 9 }], texture: 'smooth' }, 'walls.0.widthFt'],
    [{ walls: [{ widthFt: '30', heightFt: 9 }], texture: 'smooth' }, 'walls.0.widthFt'],
    [{ walls: [{ widthFt: 2, heightFt: 2, openings: [{ widthFt: 3, heightFt: 3 }] }], texture: 'smooth' }, 'walls.0.openings'],
    [{ areaFt2: 10, texture: 'glass' }, 'texture'],
    [{ areaFt2: 10, texture: 'smooth', coats: 4 }, 'coats'],
    [{ areaFt2: 10, areaM2: 10, texture: 'smooth' }, 'walls'],
    [{ areaFt2: 10, texture: 'smooth', coverageFt2PerGal: { low: 300, high: 200 } }, 'coverageFt2PerGal.high'],
    [{ areaFt2: 10, texture: 'smooth', containers: [] }, 'containers'],
    [{ areaFt2: 10, texture: 'smooth', units: 'furlongs' }, 'units'],
    [{ areaFt2: 10, texture: 'smooth', profile: 7 }, 'profile.nominalIn'],
    [{ areaFt2: 10, texture: 'smooth', profile: 'log' }, 'profile'],
    [{ areaFt2: 10, texture: 'smooth', profile: { exposedFaceIn: 6, crownHeightIn: 4 } }, 'profile.crownHeightIn'],
    [{ areaFt2: 10, texture: 'smooth', profile: { exposedFaceIn: 6 } }, 'profile.crownHeightIn'],
    [{ walls: Array.from({ length: 10_000 }, () => ({})), texture: 'smooth' }, 'walls'],
    [{ walls: Array.from({ length: 200 }, () => ({ widthFt: 400, heightFt: 100 })), texture: 'smooth' }, 'walls'],
    [{ walls: [{ ...wall, openings: Array.from({ length: 10_000 }, () => 1) }], texture: 'smooth' }, 'walls.0.openings'],
    [{ areaFt2: 10, texture: 'smooth', containers: Array.from({ length: 10_000 }, () => 1) }, 'containers'],
    [null, ''],
    [[], ''],
  ])('%j is a 422 problem at %s', async (body, field) => {
    const { status, type, json } = await ask(body);
    expect([status, type]).toEqual([422, 'application/problem+json']);
    expect(Object.keys((json as Problem).errors ?? {})).toContain(field);
  });

  test('an endless list is one fault, not one for each member', async () => {
    const { json } = await ask({ walls: Array.from({ length: 10_000 }, () => null), texture: 'smooth' });
    expect((json as Problem).errors).toEqual({ walls: 'Walls: at most 200.' });
  });

  test('text that is not JSON is a 400, a body past the limit a 413', async () => {
    expect((await ask('{')).status).toBe(400);
    expect((await ask(`"${'x'.repeat(200_001)}"`)).status).toBe(413);
  });

  test('deep nesting is a problem like any other', async () => {
    const deep = (open: string, close: string, depth: number) => `${open.repeat(depth)}1${close.repeat(depth)}`;
    expect((await ask(deep('[', ']', 50_000))).status).toBe(422);
    expect((await ask(`{"texture":"smooth","areaFt2":${deep('{"a":', '}', 20_000)}}`)).status).toBe(422);
    expect((await ask(`{"texture":"smooth","walls":${deep('[', ']', 50_000)}}`)).status).toBe(422);
    expect((await ask('{"texture":"smooth","areaFt2":1e999}')).status).toBe(422);
    expect((await ask('{"texture":"smooth","areaFt2":NaN}')).status).toBe(400);
    expect((await ask('{"texture":"smooth","areaFt2":10,"__proto__":{"coats":9},"constructor":{}}')).status).toBe(200);
  });

  test('whatever lies within the bounds is an estimate whose containers hold it', async () => {
    const real = (min: number, max: number) => fc.oneof(fc.constantFrom(min, max), fc.double({ min, max, noNaN: true }));
    const body = fc.record(
      {
        areaFt2: real(0, 100_000),
        profile: fc.oneof(fc.constantFrom(6, 8, 10), real(1, 24).chain((exposedFaceIn) => real(0, Math.min(12, exposedFaceIn / 2)).map((crownHeightIn) => ({ exposedFaceIn, crownHeightIn })))),
        texture: fc.constantFrom('smooth', 'saw-textured'),
        coats: fc.constantFrom(1, 2, 3),
        wastePercent: real(0, 50),
        coverageFt2PerGal: real(20, 2000).chain((low) => real(low, 2000).map((high) => ({ low, high }))),
        containers: fc.array(fc.record({ gal: real(1 / 128, 60), priceCents: fc.integer({ min: 0, max: 10_000_000 }) }), { minLength: 1, maxLength: 12 }),
      },
      { requiredKeys: ['areaFt2', 'texture'] },
    );
    await fc.assert(
      fc.asyncProperty(body, async (sent) => {
        const { status, json } = await ask(sent);
        const { lowGal, highGal, buyGal, containers } = json as StainAnswer;
        expect([status, lowGal <= highGal, highGal <= buyGal]).toEqual([200, true, true]);
        // Amounts are whole fluid ounces (1/128 gal) when containers are chosen.
        expect(containers.reduce((sum, { gal, count }) => sum + gal * count, 0)).toBeGreaterThanOrEqual(buyGal - 1e-6);
      }),
      { numRuns: 60 },
    );
  });

  test('whatever is sent, the answer is an estimate or a problem, never a fault', async () => {
    const number = fc.oneof(fc.double(), fc.integer(), fc.constantFrom(0, -0, 1e308, -1, 1e-300, 60, 30));
    const shaped = fc.record(
      {
        walls: fc.array(fc.record({ widthFt: number, heightFt: number, gableHeightFt: number, openings: fc.array(fc.record({ widthFt: number, heightFt: number, count: number }), { maxLength: 3 }) }, { requiredKeys: [] }), { maxLength: 3 }),
        areaFt2: number,
        profile: fc.oneof(fc.record({ nominalIn: fc.constantFrom(6, 8, 10, 7) }), fc.record({ exposedFaceIn: number, crownHeightIn: number })),
        texture: fc.constantFrom('smooth', 'saw-textured', 'x'),
        coats: number,
        wastePercent: number,
        containers: fc.array(fc.record({ gal: number, priceCents: number }), { maxLength: 4 }),
      },
      { requiredKeys: [] },
    );
    await fc.assert(
      fc.asyncProperty(fc.oneof(fc.json(), shaped.map((value) => JSON.stringify(value)), fc.string()), async (body) => {
        expect([200, 400, 422]).toContain((await ask(body)).status);
      }),
      { numRuns: 400 },
    );
  });
});
