import { join } from 'node:path';
import { compile, type JSONSchema } from 'json-schema-to-typescript';
import { TYPE_OPTIONS } from './type-options.ts';
import { ROOT, listApiSchemas, readSchema } from './schema-files.ts';

/** An umbrella over all files, so that a file referred to twice is declared once. */
const UMBRELLA = 'EverySchema';

/** Types of what goes over the API, one per file of schemas/api, named by its title. */
export async function apiTypes(): Promise<string> {
  const properties: Record<string, JSONSchema> = {};
  for (const file of await listApiSchemas()) {
    const { title } = await readSchema(join('api', file));
    if (typeof title !== 'string') throw new Error(`schemas/api/${file} has no title.`);
    if (Object.hasOwn(properties, title)) throw new Error(`schemas/api/${file}: title ${title} is taken.`);
    properties[title] = { $ref: `./${file}` };
  }
  const umbrella: JSONSchema = { title: UMBRELLA, type: 'object', properties, additionalProperties: false };
  const text = await compile(umbrella, UMBRELLA, { ...TYPE_OPTIONS, cwd: join(ROOT, 'schemas', 'api') });
  const body = text.replace(new RegExp(`export interface ${UMBRELLA} \\{[^]*?\\n\\}\\n`), '');
  return `// Written by \`npm run generate\` from schemas/api. Do not edit.\n\n${body.trimStart()}`;
}
