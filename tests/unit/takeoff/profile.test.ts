import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { courseCount, profileFactor, sealantYieldFt } from '@/lib/takeoff';

const face = fc.double({ min: 2, max: 24, noNaN: true });
const share = fc.double({ min: 0, max: 1, noNaN: true });

describe('profile factor', () => {
  /** Length of the arc added up from chords between points of the circle: an independent way to the same length. */
  function arcLength(chord: number, crown: number): number {
    const radius = (chord ** 2 / 4 + crown ** 2) / (2 * crown);
    const height = (x: number) => Math.sqrt(Math.max(0, radius ** 2 - x ** 2)) - (radius - crown);
    const pieces = 4000;
    // Points spaced by angle, close together where the arc is steep.
    const x = (k: number) => (-chord / 2) * Math.cos((Math.PI * k) / pieces);
    return Array.from({ length: pieces }, (_, k) => Math.hypot(x(k + 1) - x(k), height(x(k + 1)) - height(x(k)))).reduce((sum, piece) => sum + piece, 0);
  }

  test('is the arc over its chord, measured along the curve', () => {
    fc.assert(
      fc.property(face, fc.double({ min: 0.01, max: 1, noNaN: true }), (chord, part) => {
        const crown = (part * chord) / 2;
        expect(profileFactor(chord, crown)).toBeCloseTo(arcLength(chord, crown) / chord, 5);
      }),
      { numRuns: 50 },
    );
  });

  // Near a half-round the arcsine turns a rounding of 1e-16 into one of 1e-8.
  test('from 1 to π/2, rising with the crown, the same at any scale', () => {
    fc.assert(
      fc.property(face, share, share, fc.double({ min: 0.1, max: 10, noNaN: true }), (chord, a, b, scale) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)].map((part) => profileFactor(chord, (part * chord) / 2)) as [number, number];
        expect(low).toBeGreaterThanOrEqual(1);
        expect(high).toBeLessThanOrEqual(Math.PI / 2 + 1e-9);
        expect(low).toBeLessThanOrEqual(high + 1e-7);
        expect(profileFactor(chord * scale, (a * chord * scale) / 2)).toBeCloseTo(profileFactor(chord, (a * chord) / 2), 6);
      }),
    );
  });

  test.each([[0, 0], [8, -0.1], [8, 4.1], [NaN, 1]])('face %d, crown %d is refused', (chord, crown) => expect(() => profileFactor(chord, crown)).toThrow(RangeError));
});

describe('courses', () => {
  test('cover the wall, with less than one course too many', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 500, noNaN: true }), face, (height, exposed) => {
        const courses = courseCount(height, exposed);
        expect(courses * exposed).toBeGreaterThanOrEqual(height - 1e-6);
        expect((courses - 1) * exposed).toBeLessThan(height);
      }),
    );
  });
});

describe('sealant yield', () => {
  test('what the joint holds is what the container held', () => {
    const positive = fc.double({ min: 0.1, max: 3, noNaN: true });
    fc.assert(
      fc.property(positive, positive, fc.double({ min: 1, max: 1200, noNaN: true }), (width, depth, volume) => {
        expect((sealantYieldFt(width, depth, volume) * 12 * width * depth) / volume).toBeCloseTo(1, 9);
      }),
    );
  });

  test.each([[0, 0.25, 18], [0.25, -1, 18], [0.25, 0.25, NaN]])('%d × %d in, %d in³ is refused', (width, depth, volume) => expect(() => sealantYieldFt(width, depth, volume)).toThrow(RangeError));
});
