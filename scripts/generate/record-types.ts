import { compile, type JSONSchema } from 'json-schema-to-typescript';
import { TYPE_OPTIONS } from './type-options.ts';
import type { Schema } from './schema-files.ts';

/** Words that say when a field is needed; a type cannot, and they would turn it into an intersection. */
const CONDITIONS = new Set(['allOf', 'if', 'then', 'dependentRequired', '$id']);

/** Titles below the root would each become an exported alias of `number` or `string`. */
function plain(node: unknown, root: boolean): unknown {
  if (Array.isArray(node)) return node.map((item) => plain(item, false));
  if (typeof node !== 'object' || node === null) return node;
  const schema = node as Schema;
  const out: Record<string, unknown> = {};
  for (const [key, value] of Object.entries(schema)) {
    if (CONDITIONS.has(key) || (key === 'title' && !root && typeof value === 'string')) continue;
    out[key] = plain(value, false);
  }
  const words = schema['x-words'];
  if (Array.isArray(words) && Array.isArray(schema.type))
    out.tsType = `number | ${words.map((word) => `'${String(word)}'`).join(' | ')}`;
  return out;
}

/** Types of records, standard and product, one per schema, named by its title. */
export async function recordTypes(schemas: ReadonlyMap<string, Schema>): Promise<string> {
  const parts: string[] = [];
  for (const schema of schemas.values())
    parts.push(await compile(plain(schema, true) as JSONSchema, String(schema.title), TYPE_OPTIONS));
  return `// Written by \`npm run generate\` from schemas/. Do not edit.\n\n${parts.join('\n')}`;
}
