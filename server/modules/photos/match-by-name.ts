import type { Kind } from '#shared/records/types.ts';
import { VIEWS, VIEWS_OF_KIND } from './views.ts';

export type NamedLine = {
  readonly lineId: string;
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly occurrence: number;
};
export type NameMatch = { readonly lineId: string; readonly view: string };

/**
 * Line and view of a photograph by its file name: the structure number and a view stand in it, separators and case
 * aside (`L-1042_bore-depth.jpg`, `l1042 BoreDepth (2).JPG`). The longest wins, so that `level-after` is not `after`
 * and `L-104-2` is not `L-104`. Null when either is lacking or two fit alike: a guess would hide a missing picture.
 */
export function matchByName(fileName: string, lines: readonly NamedLine[]): NameMatch | null {
  const runs = runsOf(stem(fileName));
  const view = longest(VIEWS, runs, (name) => name);
  if (view === null) return null;
  const number = longest([...new Set(lines.map((line) => line.structureNumber))], runs, (text) => text);
  if (number === null) return null;
  const candidates = lines.filter((line) => line.structureNumber === number && line.occurrence === 1);
  const fitting = candidates.filter((line) => VIEWS_OF_KIND[line.kind].includes(view));
  const only = candidates.length === 1 ? candidates[0] : fitting.length === 1 ? fitting[0] : undefined;
  return only ? { lineId: only.lineId, view } : null;
}

/** Letters and digits only, lower case, full-width forms folded: what is left when separators do not count. */
export function squash(text: string): string {
  return (
    text
      .normalize('NFKC')
      .toLowerCase()
      .match(/\p{L}+|\p{N}+/gu) ?? []
  ).join('');
}

/** Every run of neighbouring words and numbers of the name, joined: `l 1042 kits` gives `l`, `l1042`, `l1042kits`, `1042` … */
function runsOf(text: string): ReadonlySet<string> {
  const words =
    text
      .normalize('NFKC')
      .toLowerCase()
      .match(/\p{L}+|\p{N}+/gu)
      ?.slice(0, 40) ?? [];
  const runs = new Set<string>();
  for (let from = 0; from < words.length; from += 1) {
    let run = '';
    for (const word of words.slice(from)) runs.add((run += word));
  }
  return runs;
}

function longest<T>(
  choices: readonly T[],
  runs: ReadonlySet<string>,
  textOf: (choice: T) => string,
): T | null {
  let best: T | null = null;
  let length = 0;
  let tied = false;
  for (const choice of choices) {
    const text = squash(textOf(choice));
    if (text === '' || !runs.has(text) || text.length < length) continue;
    tied = text.length === length;
    best = choice;
    length = text.length;
  }
  return tied ? null : best;
}

function stem(fileName: string): string {
  return fileName.replace(/\.[^.]*$/u, '');
}
