import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import { POST } from '@/app/api/estimates/stain/route';
import { type StainAnswer } from '@/lib/takeoff/estimate';
import { setEnvironment } from '@/tests/fixtures/environment';

vi.mock('@/app/_server/actor', () => ({ currentActor: () => Promise.resolve(null) }));
setEnvironment();

type Problem = { status: number; title: string; errors?: Record<string, string> };

async function ask(body: unknown): Promise<{ status: number; type: string | null; json: unknown }> {
  const text = typeof body === 'string' ? body : JSON.stringify(body);
  const response = await POST(new Request('https://eavewright.example/api/estimates/stain', { method: 'POST', body: text }), { params: Promise.resolve({}) });
  return { status: response.status, type: response.headers.get('content-type'), json: await response.json() };
}

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
  ])('%j is a 422 problem at %s', async (body, field) => {
    const { status, type, json } = await ask(body);
    expect([status, type]).toEqual([422, 'application/problem+json']);
    expect(Object.keys((json as Problem).errors ?? {})).toContain(field);
  });

  test('text that is not JSON is a 400, a body past the limit a 413', async () => {
    expect((await ask('{')).status).toBe(400);
    expect((await ask(`"${'x'.repeat(200_001)}"`)).status).toBe(413);
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
