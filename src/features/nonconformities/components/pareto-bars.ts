import type { NonconformitySummary } from '#shared/generated/api-types.ts';

type Rule = NonconformitySummary['byRule'][number];
export type ParetoBar = {
  /** Null: several rules together. */
  readonly code: string | null;
  readonly title: string;
  readonly count: number;
  /** Share of all findings up to and with this bar. */
  readonly running: number;
  /** Belongs to the few rules that make up the first half. */
  readonly few: boolean;
};

/** The most frequent rules, the rest as one bar. `rules` fall by count, each with its running share. */
export function paretoBars(rules: readonly Rule[], most: number): readonly ParetoBar[] {
  const shown = rules.length > most ? rules.slice(0, most - 1) : rules;
  const rest = rules.slice(shown.length);
  const bars = shown.map(({ code, title, count, share, running }) => ({
    code,
    title,
    count,
    running,
    few: running - share < 0.5,
  }));
  if (rest.length === 0) return bars;
  const count = rest.reduce((sum, rule) => sum + rule.count, 0);
  return [...bars, { code: null, title: `${rest.length} other rules`, count, running: 1, few: false }];
}

/** A title in at most `lines` lines of `width` letters, the last cut with an ellipsis where it is longer. */
export function wrapTitle(
  title: string,
  { width, lines }: { width: number; lines: number },
): readonly string[] {
  const made: string[] = [];
  for (const word of title.split(' ')) {
    const last = made.at(-1);
    if (last !== undefined && `${last} ${word}`.length <= width) made[made.length - 1] = `${last} ${word}`;
    else made.push(word);
  }
  const kept = made
    .slice(0, lines)
    .map((line) => (line.length > width ? `${line.slice(0, width - 1)}…` : line));
  if (made.length > lines) kept[lines - 1] = `${(kept[lines - 1] ?? '').slice(0, width - 1)}…`;
  return kept;
}
