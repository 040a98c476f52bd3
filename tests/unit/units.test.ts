import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { parseLength } from '@/lib/schemas/measures';
import { areaText, celsiusToFahrenheit, distanceText, fahrenheitToCelsius, feetToMetres, ft2ToM2, gallonsToLitres, inchesToMetres, lengthField, lengthText, litresToGallons, m2ToFt2, metresToFeet, metresToInches, smallLengthText, temperatureText, volumeText } from '@/lib/units';

describe('units (NIST Handbook 44, appendix C)', () => {
  test('exact factors', () => {
    expect(feetToMetres(30)).toBeCloseTo(9.144, 12);
    expect(gallonsToLitres(1)).toBe(3.785411784);
    expect(fahrenheitToCelsius(50)).toBeCloseTo(10, 12);
    expect(celsiusToFahrenheit(-40)).toBe(-40);
    expect(metresToFeet(feetToMetres(12.5))).toBeCloseTo(12.5, 12);
    expect(litresToGallons(gallonsToLitres(7))).toBeCloseTo(7, 12);
  });

  test('texts', () => {
    expect(lengthText(9.144, 'us')).toBe('30 ft');
    expect(lengthText(9.144, 'metric')).toBe('9.14 m');
    expect(areaText(234 * 0.09290304, 'us')).toBe('234 ft²');
    expect(volumeText(gallonsToLitres(4.96), 'us')).toBe('5 gal');
    expect(areaText(21.739, 'metric')).toBe('21.7 m²');
    expect(volumeText(18.776, 'metric')).toBe('18.8 L');
    expect(temperatureText(10, 'us')).toBe('50 °F');
    expect(temperatureText(4.4, 'metric')).toBe('4 °C');
    expect(smallLengthText(0.4572, 'us')).toBe('18 in');
    expect(smallLengthText(0.4572, 'metric')).toBe('45.7 cm');
    expect(distanceText(16.09344, 'us')).toBe('10 mi');
    expect(distanceText(12.4, 'metric')).toBe('12 km');
  });

  test('there and back is where it started', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (value) => {
        expect(metresToInches(inchesToMetres(value))).toBeCloseTo(value, 6);
        expect(m2ToFt2(ft2ToM2(value))).toBeCloseTo(value, 6);
        expect(fahrenheitToCelsius(celsiusToFahrenheit(value))).toBeCloseTo(value, 6);
      }),
    );
  });
});

describe('a typed length', () => {
  test.each([
    ['30', 'us', 9.144], ['30.5', 'us', 9.2964], ['30 ft 6 in', 'us', 9.2964], [`30' 6"`, 'us', 9.2964], ['18 in', 'us', 0.4572], ['18"', 'us', 0.4572],
    ['9.1', 'metric', 9.1], ['9,1 m', 'metric', 9.1], ['45 cm', 'metric', 0.45], ['45 cm', 'us', 0.45], ['10 ft', 'metric', 3.048],
  ] as const)('%s (%s)', (text, units, metres) => expect(parseLength(text, units)).toBeCloseTo(metres, 9));

  test.each([['', 'us'], ['abc', 'us'], ['-3', 'us'], ['3 x', 'metric'], ['1e3', 'us'], ['3 4', 'metric']] as const)('"%s" is none', (text, units) => expect(parseLength(text, units)).toBeNull());

  test('a stored length comes back from its form field as it was typed', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 20000 }), fc.constantFrom('us' as const, 'metric' as const), (hundredths, units) => {
      const typed = String(hundredths / 100);
      expect(lengthField(parseLength(typed, units) ?? NaN, units)).toBe(typed);
    }));
  });
});
