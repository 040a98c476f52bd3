import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lengthInput } from '@/lib/home/length-input';
import { parseLength } from '@/lib/schemas/measures';

describe('a stored length in its form', () => {
  // 1 ft = 0.3048 m and 1 in = 0.0254 m exactly (international yard and pound agreement, 1959).
  it('shows what was typed', () => {
    expect(lengthInput(9.144, 'us')).toBe('30');
    expect(lengthInput(30 * 0.3048 + 6 * 0.0254, 'us')).toBe('30 ft 6 in');
    expect(lengthInput(0.4572, 'us')).toBe('1 ft 6 in');
    expect(lengthInput(0.2032, 'us')).toBe('8 in');
    expect(lengthInput(0, 'us')).toBe('0');
    expect(lengthInput(9.1, 'metric')).toBe('9.1');
    expect(lengthInput(0.45, 'metric')).toBe('0.45');
  });

  it('reads back as the same text for every whole inch and every millimetre', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2400 }), (inches) => {
        const text = lengthInput(inches * 0.0254, 'us');
        const metres = parseLength(text, 'us');
        expect(metres).toBeCloseTo(inches * 0.0254, 9);
        expect(lengthInput(metres ?? -1, 'us')).toBe(text);
      }),
    );
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 60_000 }), (millimetres) => {
        const text = lengthInput(millimetres / 1000, 'metric');
        expect(parseLength(text, 'metric')).toBeCloseTo(millimetres / 1000, 9);
      }),
    );
  });

  it('keeps a metric length through a form in feet to the millimetre', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 60_000 }), (millimetres) => {
        const metres = parseLength(lengthInput(millimetres / 1000, 'us'), 'us');
        // Four decimals of a foot are 0.03 mm.
        expect(Math.abs((metres ?? -1) - millimetres / 1000)).toBeLessThan(0.00005);
        expect(lengthInput(metres ?? -1, 'metric')).toBe(lengthInput(millimetres / 1000, 'metric'));
      }),
    );
  });
});
