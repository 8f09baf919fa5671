import type { Tone } from './sheet-types.ts';

export const FILL: Record<Tone, string> = {
  ink: 'fill-ink',
  muted: 'fill-muted',
  nonconform: 'fill-nonconform',
  query: 'fill-query',
};

export const STROKE: Record<Tone, string> = {
  ink: 'stroke-ink-2',
  muted: 'stroke-muted',
  nonconform: 'stroke-nonconform',
  query: 'stroke-query',
};
