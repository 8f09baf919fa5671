import { apiTypes } from './api-types.ts';
import { recordTypes } from './record-types.ts';
import { readOwnSchemas } from './schema-files.ts';
import { VALIDATOR_TYPES, validators } from './validators.ts';

/** What the generator writes, by path from the project's root. */
export async function outputs(): Promise<ReadonlyMap<string, string>> {
  const schemas = await readOwnSchemas();
  return new Map([
    ['shared/generated/records.ts', await recordTypes(schemas)],
    ['shared/generated/api-types.ts', await apiTypes()],
    ['shared/generated/validators.mjs', await validators(schemas)],
    ['shared/generated/validators.d.mts', VALIDATOR_TYPES],
  ]);
}
