import type { Kind } from './types.ts';

/** Views that each kind of work is photographed in; `brand`, `rework` and `other` fit every kind. */
export const VIEWS_OF_KIND: Readonly<Record<Kind, readonly string[]>> = {
  set: ['bore-depth', 'water', 'kits', 'finish', 'plumb', 'brand', 'rework', 'other'],
  straighten: ['before', 'gap', 'kits', 'after', 'brand', 'rework', 'other'],
  relevel: ['before', 'gap', 'kits', 'level-after', 'rework', 'other'],
};

export const VIEWS: readonly string[] = [...new Set(Object.values(VIEWS_OF_KIND).flat())];

const WORDS: Readonly<Record<string, string>> = {
  'bore-depth': 'bore depth',
  kits: 'kit labels',
  brand: 'maker’s brand',
  before: 'before work',
  after: 'after work',
  'level-after': 'level after work',
};

/** What a view shows, in words: `bore depth`. */
export const viewWord = (view: string): string => WORDS[view] ?? view;
