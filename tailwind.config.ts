import type { Config } from 'tailwindcss';

/** Colour tokens are CSS variables (light and dark in app/globals.css); see DEVELOPERS.md, "Look". */
const token = (name: string) => `var(--${name})`;

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: {
        mist: token('mist'),
        snow: token('snow'),
        inset: token('inset'),
        ink: token('ink'),
        quiet: token('quiet'),
        spruce: token('spruce'),
        'spruce-strong': token('spruce-strong'),
        'on-spruce': token('on-spruce'),
        roof: token('roof'),
        'on-roof': token('on-roof'),
        lichen: token('lichen'),
        line: token('line'),
        ember: token('ember'),
        'ember-wash': token('ember-wash'),
        'on-ember': token('on-ember'),
        honey: token('honey'),
        'honey-wash': token('honey-wash'),
        driftwood: token('driftwood'),
        'dose-1': token('dose-1'),
        'dose-2': token('dose-2'),
        'dose-3': token('dose-3'),
        'dose-4': token('dose-4'),
        'dose-5': token('dose-5'),
        sun: token('sun'),
      },
      fontFamily: {
        display: ['var(--font-display)', 'Georgia', 'serif'],
        text: ['var(--font-text)', 'Verdana', 'sans-serif'],
      },
    },
  },
};

export default config;
