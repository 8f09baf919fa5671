import { createHash } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRows } from '#server/db/insert-rows.ts';
import { PHOTO_PIPELINE } from '#server/modules/photos/pipeline.ts';
import type { PhotoMeasures } from '#shared/rules/types.ts';
import { photograph } from './photograph.ts';

export const sha256Of = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');

/** Facts of photographs that are still to be handed in: the server finds them there and measures nothing. */
export async function giveFacts(
  em: EntityManager,
  photos: readonly { readonly picture: Buffer; readonly facts: PhotoMeasures }[],
): Promise<void> {
  const known = photos.map(({ picture, facts }) => ({
    sha256: sha256Of(picture),
    size: picture.length,
    facts,
  }));
  await insertRows(
    em,
    'blobs',
    known.map(({ sha256, size }) => ({ sha256, size })),
  );
  await insertRows(
    em,
    'photo_facts',
    known.map(({ sha256, facts }) => ({
      sha256,
      pipeline: PHOTO_PIPELINE,
      width: facts.width,
      height: facts.height,
      taken_wall: facts.takenWall,
      taken_at: facts.takenAtMs === null ? null : new Date(facts.takenAtMs).toISOString(),
      latitude: facts.latitude,
      longitude: facts.longitude,
      phash: facts.phash,
    })),
  );
}

/**
 * A photograph whose facts are there before it is handed in: 1000 × 750, taken at 10:00 of the work day of `setRow`, with this
 * hash. `band`: the piece of the hash that photographs of other batches are looked up by.
 */
export async function photographWithHash(
  em: EntityManager,
  options: { readonly phash: string; readonly band?: number },
): Promise<Buffer> {
  const picture = await photograph();
  const { phash, band } = options;
  const nowhere = { latitude: null, longitude: null, takenAtMs: null };
  const facts = { ...nowhere, takenWall: '2026-04-14T10:00:00', width: 1000, height: 750, phash };
  await giveFacts(em, [{ picture, facts }]);
  if (band !== undefined)
    await insertRows(em, 'photo_bands', [{ band: 0, value: band, sha256: sha256Of(picture) }]);
  return picture;
}
