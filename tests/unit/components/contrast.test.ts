import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';

/** WCAG 2.2, definitions of relative luminance and contrast ratio: https://www.w3.org/TR/WCAG22/#dfn-contrast-ratio */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((i) => parseInt(hex.slice(i, i + 2), 16) / 255).map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4));
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(a: string, b: string): number {
  const [light = 0, dark = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (light + 0.05) / (dark + 0.05);
}

const css = readFileSync(path.resolve(__dirname, '../../../app/globals.css'), 'utf8');
const tokens = (block: string) => Object.fromEntries([...block.matchAll(/--([\w-]+): (#[0-9a-f]{6});/g)].map((match) => [match[1], match[2]]));
const lightTokens = tokens(css.slice(0, css.indexOf('prefers-color-scheme')));
const darkTokens = { ...lightTokens, ...tokens(css.slice(css.indexOf('prefers-color-scheme'), css.indexOf('@layer base'))) };

const surfaces = ['mist', 'snow', 'inset', 'honey-wash', 'ember-wash'];
const pairs: [text: string, on: string, least: number][] = [
  ...surfaces.flatMap((on): [string, string, number][] => [
    ['ink', on, 7],
    ['quiet', on, 4.5],
    ['spruce', on, 4.5],
    ['ember', on, 4.5],
    ['lichen', on, 3],
  ]),
  ['on-spruce', 'spruce', 4.5],
  ['on-spruce', 'spruce-strong', 4.5],
  ['on-ember', 'ember', 4.5],
  ['on-roof', 'roof', 7],
];

describe.each([
  ['light', lightTokens],
  ['dark', darkTokens],
])('colours, %s', (_scheme, colours) => {
  it.each(pairs)('%s on %s reaches %s : 1', (text, on, least) => {
    expect(contrast(colours[text] ?? '#000000', colours[on] ?? '#000000')).toBeGreaterThanOrEqual(least);
  });
});

it('knows black on white', () => expect(contrast('#000000', '#ffffff')).toBeCloseTo(21));
