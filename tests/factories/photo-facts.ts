import { createHash } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { PHOTO_PIPELINE } from '#server/modules/photos/pipeline.ts';
import { photograph } from './photograph.ts';

/**
 * A photograph whose facts are there before it is handed in: 1000 × 750, taken at 10:00 of the work day of `setRow`, with this
 * hash. `band`: the piece of the hash that photographs of other batches are looked up by.
 */
export async function photographWithHash(
  em: EntityManager,
  options: { readonly phash: string; readonly band?: number },
): Promise<Buffer> {
  const bytes = await photograph();
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  await run(em, 'insert into blobs (sha256, size) values ($1, $2)', [sha256, bytes.length]);
  await run(
    em,
    `insert into photo_facts (sha256, pipeline, width, height, taken_wall, phash)
     values ($1, $2, 1000, 750, '2026-04-14T10:00:00', $3)`,
    [sha256, PHOTO_PIPELINE, options.phash],
  );
  if (options.band !== undefined)
    await run(em, 'insert into photo_bands (band, value, sha256) values (0, $1, $2)', [options.band, sha256]);
  return bytes;
}
