import { readFile, readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const ROOT = fileURLToPath(new URL('../../', import.meta.url));

export type Schema = { readonly [key: string]: unknown };

/** Record schemas by the name under which `validateRecord` knows them. */
export const RECORD_SCHEMAS = ['set', 'straighten', 'relevel', 'pour', 'event', 'photo', 'batch'] as const;

export async function readSchema(path: string): Promise<Schema> {
  return JSON.parse(await readFile(join(ROOT, 'schemas', path), 'utf8')) as Schema;
}

/** Schemas with a type and a validator of their own, by validator name. */
export async function readOwnSchemas(): Promise<ReadonlyMap<string, Schema>> {
  const schemas = new Map<string, Schema>();
  for (const name of RECORD_SCHEMAS)
    schemas.set(name, await readSchema(join('records', name, 'v1.schema.json')));
  schemas.set('standard', await readSchema(join('standard', 'v1.schema.json')));
  schemas.set('product', await readSchema(join('product', 'v1.schema.json')));
  return schemas;
}

/** Files of schemas/api, sorted so that the output does not depend on the file system. */
export async function listApiSchemas(): Promise<readonly string[]> {
  const names = await readdir(join(ROOT, 'schemas', 'api')).catch(() => []);
  return names.filter((name) => name.endsWith('.schema.json')).sort();
}
