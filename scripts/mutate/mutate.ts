import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { bundleTest, findMutants, isMutated, ROOT, type Bundle } from './bundle-tests.ts';
import { EQUIVALENT } from './equivalent.ts';
import { switchCalls, type MutantSwitch } from './mutant-switch.ts';
import { isListed, matchEquivalents } from './match-equivalents.ts';
import { runBundle } from './run-bundle.ts';

/**
 * `npm run mutate [-- path …]`: flips every comparison of shared/rules and shared/calc (or of the files whose path
 * begins as given), one at a time, and runs the unit tests of these folders that reach it. Exit 1 when a flip is not noticed.
 */

const began = performance.now();
const wanted = process.argv.slice(2);
const shared = (await readdir(join(ROOT, 'shared'), { recursive: true }))
  .map((file) => `shared/${file}`)
  .toSorted();
const files = shared.filter(
  (file) => isMutated(file) && (wanted.length === 0 || wanted.some((start) => file.startsWith(start))),
);
if (files.length === 0)
  throw new Error(`No file of shared/rules or shared/calc begins with ${wanted.join(', ')}.`);

const { mutants, texts } = await findMutants(files);
const state: MutantSwitch = { active: -1, hits: new Map(), budget: Infinity };
const calls = switchCalls(state, mutants);

type Covering = {
  readonly bundle: Bundle;
  readonly hits: ReadonlyMap<number, number>;
  readonly asked: number;
  readonly ms: number;
};
const covering: Covering[] = [];
const broken: string[] = [];
for (const file of shared.filter((path) => /^shared\/(rules|calc)\/.*\.test\.ts$/.test(path))) {
  const bundle = await bundleTest(file, texts);
  state.hits = new Map();
  const start = performance.now();
  const failed = await runBundle(bundle, calls);
  if (failed)
    broken.push(`${file} fails as it stands, so it proves nothing: ${failed.test}: ${String(failed.error)}`);
  else if (state.hits.size > 0) {
    const asked = [...state.hits.values()].reduce((sum, hits) => sum + hits, 0);
    covering.push({ bundle, hits: state.hits, asked, ms: performance.now() - start });
  }
}

const killedBy = async (id: number): Promise<string | null> => {
  const folder = mutants[id]?.file.replace(/[^/]+$/, '') ?? '';
  const near = ({ bundle, ms }: Covering) => (bundle.file.startsWith(folder) ? 0 : 1e6) + ms;
  for (const one of covering.filter(({ hits }) => hits.has(id)).toSorted((a, b) => near(a) - near(b))) {
    Object.assign(state, { active: id, budget: 100_000 + 10 * one.asked });
    const failed = await runBundle(one.bundle, calls);
    if (failed) return `${one.bundle.file}: ${failed.test}`;
  }
  return null;
};

const report = (id: number) => {
  const mutant = mutants[id];
  if (!mutant) return;
  const reached = covering.some(({ hits }) => hits.has(id)) ? '' : ' (no test reaches it)';
  console.log(`${mutant.file}:${mutant.line}  ${mutant.from} -> ${mutant.to}  ${mutant.code}${reached}`);
};
const survivors: number[] = [];
for (const id of mutants.keys()) {
  if ((await killedBy(id)) !== null) continue;
  survivors.push(id);
  if (!isListed(mutants[id], EQUIVALENT)) report(id);
}

const { equivalent, faults } = matchEquivalents({ mutants, survivors, files, listed: EQUIVALENT });
const missed = survivors.filter((id) => !equivalent.has(id));
for (const fault of [...broken, ...faults]) console.log(fault);
const killed = mutants.length - survivors.length;
const seconds = Math.round((performance.now() - began) / 1000);
console.log(
  `${mutants.length} comparisons flipped in ${files.length} files: ${killed} noticed, ${equivalent.size} equivalent, ${missed.length} not noticed; ${seconds} s.`,
);
process.exitCode = missed.length + broken.length + faults.length > 0 ? 1 : 0;
