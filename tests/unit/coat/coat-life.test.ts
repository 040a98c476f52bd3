import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { coatLife, type CoatInput, sealLife } from '@/lib/coat';
import { finishes, keysOf, sealants, textures, woods } from '@/lib/schemas/vocabulary';

const input = (values: Partial<CoatInput> = {}): CoatInput => ({
  finish: 'semitransparent',
  texture: 'saw-textured',
  wood: 'pine-fir-spruce',
  doseKwhM2: 800,
  scheffer: 50,
  heightM: 2.5,
  eaveDepthM: 0,
  weatherSide: false,
  ...values,
});

describe('coat life, worked by hand from the formula', () => {
  it('weighs sun and rain', () => {
    // Sun share (800 − 250) / 1100 = 0.5; rain share 0.5; severity 0.5; 7 − 0.5 × 3 = 5.5 years.
    expect(coatLife(input())).toMatchObject({ months: 66, lowYears: 4, highYears: 7, severity: 0.5 });
    // Solid color on smooth cedar, sun share 1, rain share 0: severity 0.5, 10 − 0.5 × 4 = 8 years.
    expect(coatLife(input({ finish: 'solid-color', texture: 'smooth', wood: 'cedar-redwood', doseKwhM2: 1350, scheffer: 0 })).months).toBe(96);
    // Tinted clear on saw-textured wood, sun share 1, rain share 0: severity 0.7, 3 − 0.7 = 2.3 years = 27.6 months.
    expect(coatLife(input({ finish: 'tinted-clear', doseKwhM2: 1350, scheffer: 0 })).months).toBe(28);
  });

  it('lets an eave keep rain off, down to 0.3 at half the wall’s height, and a weather side take more', () => {
    // Rain alone: dose 250; severity 0.35 × rain share × exposure.
    const severity = (values: Partial<CoatInput>) => coatLife(input({ doseKwhM2: 250, scheffer: 100, ...values })).severity;
    expect(severity({})).toBeCloseTo(0.35, 12);
    expect(severity({ eaveDepthM: 0.625 })).toBeCloseTo(0.35 * 0.65, 12);
    expect(severity({ eaveDepthM: 1.25 })).toBeCloseTo(0.35 * 0.3, 12);
    expect(severity({ eaveDepthM: 3 })).toBeCloseTo(0.35 * 0.3, 12);
    expect(severity({ weatherSide: true })).toBeCloseTo(0.35, 12);
    expect(severity({ eaveDepthM: 1.25, weatherSide: true })).toBeCloseTo(0.35 * 0.36, 12);
  });

  it('scales by the wall’s own factor', () => {
    expect(coatLife(input({ factor: 1.5 })).months).toBe(99);
    expect(coatLife(input({ factor: 0.5 })).months).toBe(33);
  });

  it('reaches both ends of the range', () => {
    expect(coatLife(input({ doseKwhM2: 0, scheffer: 0 })).months).toBe(84);
    expect(coatLife(input({ doseKwhM2: 2000, scheffer: 140 })).months).toBe(48);
  });
});

describe('a wood that is not known', () => {
  it('takes the shorter-lived wood where the wood is not known, and says so', () => {
    const life = coatLife(input({ wood: 'other' }));
    expect(life.highYears).toBe(7);
    expect(life.explanation.inputs).toContainEqual({ label: 'Wood', value: 'Another wood or not known: counted as pine, fir or spruce (our rule)' });
  });
});

const finite = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const anyInput: fc.Arbitrary<CoatInput & { sealant: keyof typeof sealants }> = fc.record({
  finish: fc.constantFrom(...keysOf(finishes)),
  texture: fc.constantFrom(...keysOf(textures)),
  wood: fc.constantFrom(...keysOf(woods)),
  sealant: fc.constantFrom(...keysOf(sealants)),
  doseKwhM2: finite(0, 2500),
  scheffer: finite(0, 150),
  heightM: finite(1, 12),
  eaveDepthM: finite(0, 4),
  weatherSide: fc.boolean(),
});

describe.each([
  ['coat', coatLife],
  ['seal', sealLife],
])('%s life, whatever the wall', (_, life) => {
  it('lies within the published range', () => {
    fc.assert(
      fc.property(anyInput, (wall) => {
        const { months, lowYears, highYears } = life(wall);
        expect(months).toBeGreaterThanOrEqual(12 * lowYears);
        expect(months).toBeLessThanOrEqual(12 * highYears);
        expect(Number.isInteger(months)).toBe(true);
      }),
    );
  });

  it('is never longer for more sun, more rain, a shallower eave or the weather side', () => {
    fc.assert(
      fc.property(anyInput, finite(0, 1000), finite(0, 50), finite(0, 1), (wall, sun, rain, share) => {
        const harder = { ...wall, doseKwhM2: wall.doseKwhM2 + sun, scheffer: wall.scheffer + rain, eaveDepthM: wall.eaveDepthM * share, weatherSide: true };
        for (const field of ['doseKwhM2', 'scheffer', 'eaveDepthM', 'weatherSide'] as const) {
          const one = { ...wall, [field]: harder[field] };
          expect(life(one).months).toBeLessThanOrEqual(life(wall).months);
          expect(life(one).severity).toBeGreaterThanOrEqual(life(wall).severity - 1e-12);
        }
      }),
    );
  });
});

describe('explanations', () => {
  it('give the figure, its inputs, and what is published and what is our rule', () => {
    const { explanation } = coatLife(input());
    expect(explanation).toMatchObject({ figure: 'Coat life of this wall', value: '5 years 6 months' });
    expect(explanation.inputs).toContainEqual({ label: 'Range for this film', value: '4 to 7 years' });
    expect(explanation.inputs).toContainEqual({ label: 'Severity', value: '0.50' });
    expect(explanation.sources.map(({ ground }) => ground)).toEqual(['memory', 'our rule', 'published']);
    expect(sealLife({ ...input(), sealant: 'silicone' }).explanation.sources[0]?.ground).toBe('common practice');
  });

  it('worked seal life: acrylic latex in full sun and no rain', () => {
    // Severity 0.6; 10 − 0.6 × 5 = 7 years.
    expect(sealLife({ ...input({ doseKwhM2: 1350, scheffer: 0 }), sealant: 'acrylic-latex' })).toMatchObject({ months: 84, lowYears: 5, highYears: 10 });
  });
});

describe('a coat under a porch roof or a deck', () => {
  // Rain alone, as above: dose 250; severity 0.35 × exposure on a wall 2.5 m high.
  const rain = (values: Partial<CoatInput>) => coatLife(input({ doseKwhM2: 250, scheffer: 100, ...values }));
  const porch = (values = {}) => ({ depthM: 2.4, heightM: 2, share: 0.5, ...values });

  it('is sheltered by area, worked by hand', () => {
    // 0.5 × 2 / 2.5 = 0.4 of the wall is under it, deeper than half of its 2 m: 1 − 0.7 × 0.4 = 0.72.
    expect(rain({ cover: porch() }).severity).toBeCloseTo(0.35 * 0.72, 12);
    // 0.5 m deep: half sheltered; 1 − 0.7 × 0.4 × 0.5 = 0.86.
    expect(rain({ cover: porch({ depthM: 0.5 }) }).severity).toBeCloseTo(0.35 * 0.86, 12);
    // An eave of 0.625 m shelters by half; under the porch wholly: 1 − 0.7 × (0.6 × 0.5 + 0.4) = 0.51.
    expect(rain({ cover: porch(), eaveDepthM: 0.625 }).severity).toBeCloseTo(0.35 * 0.51, 12);
    // All of it under a deck at its top: an eave of that depth.
    expect(rain({ cover: porch({ heightM: 2.5, share: 1 }) }).severity).toBeCloseTo(0.35 * 0.3, 12);
  });

  it('never shortens a life and never keeps more off than the deepest eave; without one nothing changes', () => {
    const metres = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(metres(1.5, 8), metres(0, 3), fc.boolean(), fc.record({ depthM: metres(0.3, 5), heightM: metres(0.5, 9), share: metres(0, 1) }), (heightM, eaveDepthM, weatherSide, cover) => {
        const bare = input({ heightM, eaveDepthM, weatherSide });
        const covered = coatLife({ ...bare, cover });
        expect(covered.severity).toBeLessThanOrEqual(coatLife(bare).severity + 1e-12);
        expect(covered.severity).toBeGreaterThanOrEqual(coatLife({ ...bare, eaveDepthM: heightM }).severity - 1e-12);
        expect(sealLife({ ...bare, sealant: 'silicone', cover }).months).toBeGreaterThanOrEqual(sealLife({ ...bare, sealant: 'silicone' }).months);
        for (const none of [undefined, { ...cover, share: 0 }, { ...cover, depthM: 0 }]) expect(coatLife({ ...bare, cover: none })).toEqual(coatLife(bare));
      }),
    );
  });

  it('is named among what the life came from, and only then', () => {
    const named = { label: 'Porch roof or deck', value: 'over 50 % of the width, 120 % as deep as the wall under it is high' };
    for (const { explanation } of [coatLife(input({ cover: porch() })), sealLife({ ...input({ cover: porch() }), sealant: 'silicone' })]) {
      expect(explanation.inputs).toContainEqual(named);
      expect(explanation.sources.at(-1)).toMatchObject({ ground: 'our rule', text: expect.stringContaining('porch roof') as string });
    }
    expect(coatLife(input()).explanation.inputs.map(({ label }) => label)).not.toContain(named.label);
    expect(coatLife(input()).explanation.sources.map(({ text }) => text).join()).not.toContain('porch roof');
  });
});
