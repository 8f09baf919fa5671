import type { Mutant } from './bundle-tests.ts';
import type { Equivalent } from './equivalent.ts';

type Input = {
  readonly mutants: readonly Mutant[];
  readonly survivors: readonly number[];
  /** The files looked at: entries of others are left alone. */
  readonly files: readonly string[];
  readonly listed: readonly Equivalent[];
};

const isOf = (mutant: Mutant | undefined, entry: Equivalent) =>
  mutant?.file === entry.file && mutant.code === entry.code && mutant.to === entry.to;

export const isListed = (mutant: Mutant | undefined, listed: readonly Equivalent[]): boolean =>
  listed.some((entry) => isOf(mutant, entry));

/** Which survivors are listed, and what is wrong with the list. */
export function matchEquivalents({ mutants, survivors, files, listed }: Input) {
  const equivalent = new Set<number>();
  const faults: string[] = [];
  for (const entry of listed.filter(({ file }) => files.includes(file))) {
    const ids = [...mutants.keys()].filter((id) => isOf(mutants[id], entry));
    const alive = ids.filter((id) => survivors.includes(id));
    for (const id of alive) equivalent.add(id);
    const named = `equivalent.ts: ${entry.file}, ${entry.code} (${entry.to})`;
    if (ids.length === 0) faults.push(`${named} matches no comparison any more: take it out.`);
    else if (alive.length === 0) faults.push(`${named} is noticed by a test: take it out.`);
  }
  return { equivalent, faults };
}
