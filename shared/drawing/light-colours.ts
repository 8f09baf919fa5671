/**
 * The named colours on light ground: the tokens of the screens, and of everything that is printed. Every text token has at
 * least 4.5 : 1 on paper, sheet and sunk, field borders (`rule`) at least 3 : 1.
 */
export const LIGHT_COLOURS = {
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
} as const;

export type ColourName = keyof typeof LIGHT_COLOURS;
