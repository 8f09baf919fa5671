import { readFile } from 'node:fs/promises';
import { basename, join, relative } from 'node:path';
import { pathToFileURL } from 'node:url';
import { Script } from 'node:vm';
import { build, type Plugin } from 'esbuild';
import { findComparisons, type Comparison } from './find-comparisons.ts';
import { instrument } from './instrument.ts';

export const ROOT = join(import.meta.dirname, '../..');
export type Mutant = Comparison & { readonly file: string };
export type Bundle = { readonly file: string; readonly script: Script };

/** Files whose comparisons are flipped: the rules and the computations, without their tests and test helpers. */
export const isMutated = (file: string): boolean =>
  /^shared\/(rules|calc)\/.*\.ts$/.test(file) &&
  !file.endsWith('.test.ts') &&
  !['testing.ts', 'describe-rule.ts'].includes(basename(file));

/** Numbers the comparisons of `files` (paths from the root) and keeps each file's instrumented text. */
export async function findMutants(files: readonly string[]) {
  const mutants: Mutant[] = [];
  const texts = new Map<string, string>();
  for (const file of files) {
    const source = await readFile(join(ROOT, file), 'utf8');
    const found = findComparisons(file, source);
    texts.set(file, instrument(source, found, mutants.length));
    mutants.push(...found.map((comparison) => ({ ...comparison, file })));
  }
  return { mutants, texts };
}

const instrumented = (texts: ReadonlyMap<string, string>): Plugin => ({
  name: 'instrumented',
  setup: (build) => {
    build.onResolve({ filter: /^#/ }, ({ path }) => ({ path: join(ROOT, path.slice(1)) }));
    build.onLoad({ filter: /\/shared\/(rules|calc)\/.*\.ts$/ }, ({ path }) => {
      const contents = texts.get(relative(ROOT, path));
      return contents === undefined ? undefined : { contents, loader: 'ts' };
    });
  },
});

/** One test file with all that it imports, compiled once; packages stay outside. */
export async function bundleTest(file: string, texts: ReadonlyMap<string, string>): Promise<Bundle> {
  const { outputFiles } = await build({
    entryPoints: [join(ROOT, file)],
    bundle: true,
    write: false,
    format: 'cjs',
    platform: 'node',
    target: 'node20',
    packages: 'external',
    plugins: [instrumented(texts)],
    logLevel: 'error',
    // Only tests ask where they lie: what they import from shared/ is pure.
    define: { 'import.meta.url': JSON.stringify(pathToFileURL(join(ROOT, file)).href) },
  });
  const code = outputFiles[0]?.text ?? '';
  const wrapped = `(function (require, module, exports, __compare, __named) {${code}\n})`;
  return { file, script: new Script(wrapped, { filename: file }) };
}
