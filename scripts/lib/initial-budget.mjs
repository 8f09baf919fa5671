import { gzipSync } from 'node:zlib';

/** What the first page of a visit may fetch of JavaScript, gzipped: kilobytes of 1,000 bytes. */
const MOST_KB = 170;

/**
 * Fails a build whose first page fetches more JavaScript than a slow connection bears, and says what is in it: the entry,
 * what it imports, and the scripts that the page names.
 * @returns {import('vite').Plugin}
 */
export function initialBudget({ mostKb = MOST_KB } = {}) {
  return {
    name: 'initial-budget',
    apply: 'build',
    generateBundle: {
      order: 'post',
      handler(_options, bundle) {
        const chunks = initialChunks(bundle);
        const sizes = chunks.map((chunk) => ({ chunk, kb: gzipSync(chunk.code).length / 1000 }));
        const total = sizes.reduce((sum, { kb }) => sum + kb, 0);
        if (total <= mostKb) {
          this.info(`initial JavaScript ${total.toFixed(1)} kB gzipped, at most ${mostKb}`);
          return;
        }
        const said = sizes
          .toSorted((a, b) => b.kb - a.kb)
          .map(({ chunk, kb }) => `  ${kb.toFixed(1).padStart(7)} kB  ${chunk.fileName}\n${largest(chunk)}`);
        this.error(
          `The first page fetches ${total.toFixed(1)} kB of JavaScript gzipped, and ${mostKb} is the most. It is made of:\n${said.join('\n')}\nFetch a part of it only where it is used (a lazy route), or leave it out.`,
        );
      },
    },
  };
}

/** Entry chunks of the page and all that they import without waiting. */
function initialChunks(bundle) {
  const found = new Map();
  const add = (fileName) => {
    const chunk = bundle[fileName];
    if (chunk?.type !== 'chunk' || found.has(fileName)) return;
    found.set(fileName, chunk);
    for (const imported of chunk.imports) add(imported);
  };
  for (const chunk of Object.values(bundle)) if (chunk.type === 'chunk' && chunk.isEntry) add(chunk.fileName);
  return [...found.values()];
}

/** The largest modules of a chunk, before they are packed. */
function largest(chunk) {
  return Object.entries(chunk.modules)
    .map(([id, { renderedLength }]) => ({ name: id.split('/node_modules/').at(-1) ?? id, renderedLength }))
    .toSorted((a, b) => b.renderedLength - a.renderedLength)
    .slice(0, 8)
    .map(
      ({ name, renderedLength }) =>
        `            ${(renderedLength / 1000).toFixed(1).padStart(7)} kB ${name}`,
    )
    .join('\n');
}
