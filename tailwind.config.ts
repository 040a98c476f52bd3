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
        ink: token('ink'),
        spruce: token('spruce'),
        'on-spruce': token('on-spruce'),
        lichen: token('lichen'),
        line: token('line'),
        ember: token('ember'),
        honey: token('honey'),
        driftwood: token('driftwood'),
        'dose-1': token('dose-1'),
        'dose-2': token('dose-2'),
        'dose-3': token('dose-3'),
        'dose-4': token('dose-4'),
        'dose-5': token('dose-5'),
      },
      fontFamily: {
        display: ['var(--font-display)', 'Georgia', 'serif'],
        text: ['var(--font-text)', 'Verdana', 'sans-serif'],
      },
      boxShadow: { course: '0 1px 0 0 var(--line), 0 6px 10px -8px var(--course-shadow)' },
    },
  },
};

export default config;
