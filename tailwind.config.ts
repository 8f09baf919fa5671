import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';
import { LIGHT_COLOURS } from './shared/drawing/light-colours.ts';

/**
 * The named tokens of both themes; components use the names only, never a colour value. The light ones are also what a
 * PDF is printed in, so they stand with the drawings.
 */
const LIGHT = {
  ...LIGHT_COLOURS,
  // Over the page behind a dialog: dims it in both themes, where a tint of the paper would wash it out.
  scrim: 'rgb(21 35 60 / 0.48)',
} as const;

type Token = keyof typeof LIGHT;

const DARK: Record<Token, string> = {
  paper: '#0d2136',
  sheet: '#112a44',
  sunk: '#0a1a2c',
  ink: '#e4edf7',
  'ink-2': '#bccbdd',
  muted: '#94a9c2',
  hairline: '#28456a',
  rule: '#5b7ba3',
  focus: '#8ab4ff',
  accent: '#ff9248',
  'on-accent': '#0d2136',
  conform: '#6fd3a4',
  nonconform: '#ff8e88',
  query: '#f0c063',
  concession: '#c3a6f5',
  pole: '#c9a37c',
  'pole-fill': '#5b4733',
  foam: '#8a7a3f',
  'foam-cell': '#e6d28d',
  water: '#7cc0ef',
  'water-fill': '#24587f',
  soil: '#6f88a8',
  rock: '#8fa3bb',
  scrim: 'rgb(3 8 15 / 0.68)',
};

function variables(tokens: Record<Token, string>): Record<string, string> {
  return Object.fromEntries(Object.entries(tokens).map(([name, value]) => [`--${name}`, value]));
}

const light = { ...variables(LIGHT), 'color-scheme': 'light' };
const dark = { ...variables(DARK), 'color-scheme': 'dark' };

export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...Object.fromEntries(Object.keys(LIGHT).map((name) => [name, `var(--${name})`])),
    },
    fontFamily: { sans: ['"Noto Sans"', '"Noto Sans fallback"', 'sans-serif'] },
    fontSize: {
      micro: ['0.6875rem', '0.9375rem'],
      small: ['0.78125rem', '1.125rem'],
      table: ['0.84375rem', '1.25rem'],
      base: ['0.875rem', '1.3125rem'],
      lead: ['1rem', '1.5rem'],
      title: ['1.1875rem', '1.625rem'],
      display: ['1.75rem', '2.25rem'],
    },
    borderRadius: { none: '0', DEFAULT: '1px', key: '2px', full: '9999px' },
    extend: {
      spacing: { band: '2.75rem', row: '2rem', gutter: '1.125rem' },
      letterSpacing: { stamp: '0.09em' },
    },
  },
  plugins: [
    plugin((api) => {
      api.addBase({
        ':root': light,
        '@media (prefers-color-scheme: dark)': { ":root:not([data-theme='light'])": dark },
        ":root[data-theme='dark']": dark,
        // Paper is paper: a sheet printed from the dark theme would be a page of toner.
        '@media print': { ":root, :root[data-theme='dark'], :root:not([data-theme='light'])": light },
      });
    }),
  ],
} satisfies Config;
