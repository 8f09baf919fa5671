import type { Kind } from '#shared/records/types.ts';
import { VIEWS, VIEWS_OF_KIND } from '#shared/records/photo-views.ts';

export type NamedLine = {
  readonly lineId: string;
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly occurrence: number;
};
export type NameMatch = { readonly lineId: string; readonly view: string };

/** Lines by their squashed structure number, made once for all photographs of a batch. */
export type NameIndex = ReadonlyMap<string, readonly NamedLine[]>;

export function nameIndex(lines: readonly NamedLine[]): NameIndex {
  const index = new Map<string, NamedLine[]>();
  for (const line of lines) {
    const key = squash(line.structureNumber);
    const same = index.get(key);
    if (same) same.push(line);
    else if (key !== '') index.set(key, [line]);
  }
  return index;
}

/**
 * Line and view of a photograph by its file name: the structure number and a view stand in it, separators and case
 * aside (`L-1042_bore-depth.jpg`, `l1042 BoreDepth (2).JPG`). The longest wins, so that `level-after` is not `after`
 * and `L-104-2` is not `L-104`. Null when either is lacking or two fit alike: a guess would hide a missing picture.
 */
export function matchByName(fileName: string, lines: NameIndex): NameMatch | null {
  const runs = runsOf(stem(fileName));
  const view = longest(VIEW_INDEX, runs);
  const candidates = longest(lines, runs)?.filter((line) => line.occurrence === 1);
  if (!view || !candidates) return null;
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

/** What the longest run that the index knows stands for; null for none, and for two different ones of that length. */
function longest<T>(index: ReadonlyMap<string, T>, runs: ReadonlySet<string>): T | null {
  const known = [...runs].filter((run) => index.has(run));
  const length = Math.max(0, ...known.map((run) => run.length));
  const best = known.filter((run) => run.length === length);
  const [only] = best;
  return best.length === 1 && only !== undefined ? (index.get(only) ?? null) : null;
}

const VIEW_INDEX: ReadonlyMap<string, string> = new Map(VIEWS.map((view) => [squash(view), view]));

function stem(fileName: string): string {
  return fileName.replace(/\.[^.]*$/u, '');
}
