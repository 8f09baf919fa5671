import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';

/**
 * The named tokens. Every text token has at least 4.5 : 1 on paper, sheet and sunk in both themes,
 * field borders (`rule`) at least 3 : 1. Components use the names only, never a colour value.
 */
const LIGHT = {
  paper: '#f5f2e9',
  sheet: '#fcfaf4',
  sunk: '#ebe6d9',
  ink: '#15233c',
  'ink-2': '#3d4a63',
  muted: '#59647a',
  hairline: '#cfc8b6',
  rule: '#8f8a7b',
  focus: '#1d4ed8',
  accent: '#b83d08',
  'on-accent': '#ffffff',
  conform: '#1d6547',
  nonconform: '#a3181c',
  query: '#7f5200',
  concession: '#593a8f',
  pole: '#8b6848',
  'pole-fill': '#d9bf9a',
  foam: '#e6d28d',
  'foam-cell': '#b89b45',
  water: '#5e9cc7',
  'water-fill': '#a9cfe8',
  soil: '#a9977a',
  rock: '#77787a',
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
