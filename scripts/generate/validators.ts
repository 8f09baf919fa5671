import { Ajv2020 } from 'ajv/dist/2020.js';
import standaloneCode from 'ajv/dist/standalone/index.js';
import { build } from 'esbuild';
import { join } from 'node:path';
import { ROOT, type Schema } from './schema-files.ts';

/** Without titles, hints and our own `x-` words, which check nothing and would be carried into the browser. */
function bare(node: unknown): unknown {
  if (Array.isArray(node)) return node.map(bare);
  if (typeof node !== 'object' || node === null) return node;
  const kept = Object.entries(node).filter(
    ([key, value]) =>
      !key.startsWith('x-') && !(['title', 'description'].includes(key) && typeof value === 'string'),
  );
  return Object.fromEntries(kept.map(([key, value]) => [key, bare(value)]));
}

/** Ajv's standalone code as one ES module without `require` or `eval`: it runs under a strict content-security policy. */
export async function validators(schemas: ReadonlyMap<string, Schema>): Promise<string> {
  const ajv = new Ajv2020({
    allErrors: true,
    allowUnionTypes: true,
    strict: true,
    strictRequired: false,
    messages: false,
    code: { source: true, esm: true },
  });
  const names: Record<string, string> = {};
  for (const [name, schema] of schemas) {
    ajv.addSchema(bare(schema) as Schema);
    names[name] = String(schema.$id);
  }
  const compiled = standaloneCode(ajv, names);
  const bundle = await build({
    absWorkingDir: ROOT,
    entryPoints: [join(ROOT, 'scripts/generate/validators-entry.ts')],
    bundle: true,
    write: false,
    format: 'esm',
    platform: 'neutral',
    target: 'es2022',
    mainFields: ['module', 'main'],
    legalComments: 'none',
    minify: true,
    banner: { js: '// Written by `npm run generate` from schemas/. Do not edit.' },
    plugins: [
      {
        name: 'compiled-schemas',
        setup(context) {
          context.onResolve({ filter: /^compiled-schemas$/ }, () => ({
            path: 'compiled-schemas',
            namespace: 'compiled',
          }));
          // Ajv's few run-time helpers are required from here.
          context.onLoad({ filter: /.*/, namespace: 'compiled' }, () => ({
            contents: compiled,
            loader: 'js',
            resolveDir: ROOT,
          }));
        },
      },
    ],
  });
  const file = bundle.outputFiles[0];
  if (file === undefined) throw new Error('The bundler wrote nothing.');
  return file.text;
}

export const VALIDATOR_TYPES = `// Written by \`npm run generate\`. Do not edit.
import type { FieldFault } from '../calc/field-fault.ts';

export type RecordName = 'set' | 'straighten' | 'relevel' | 'pour' | 'event' | 'photo' | 'batch';
export type { FieldFault };

/** Faults of one row, one a field; empty when there is none. Never throws. */
export function validateRecord(kind: RecordName, values: unknown): FieldFault[];
export function validateStandard(value: unknown): FieldFault[];
export function validateProduct(value: unknown): FieldFault[];
`;
