import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound } from '#server/http/problem.ts';
import type { Photo } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { PHOTO_SELECT, PHOTO_WALL, type PhotoDbRow } from './photo-select.ts';
import { PHOTO_PIPELINE } from './pipeline.ts';
import { presentPhoto } from './present-photo.ts';

type Viewer = { actor: Actor; ability: Ability };
const MOST = 5_000;

/** @throws Problem 404 for another contractor's batch as for none */
export async function listPhotos(
  em: EntityManager,
  options: Viewer & { batchId: string },
): Promise<{ items: Photo[] }> {
  const wall = contractorWall(options.ability, 'read', 'Photo');
  const batch = await row(
    em,
    'select id from batches where id = $1 and ($2::uuid is null or contractor_id = $2)',
    [options.batchId, wall],
  );
  if (!batch) throw notFound();
  const found = await rows<PhotoDbRow>(
    em,
    `${PHOTO_SELECT} where ${PHOTO_WALL} and p.batch_id = $4 order by p.at, p.file_name, p.id limit ${MOST}`,
    [PHOTO_PIPELINE, wall, options.actor.orgKind === 'contractor', options.batchId],
  );
  return { items: found.map((photo) => presentPhoto(photo, options)) };
}

/** Photographs that lie on a line, as the record sheet shows them. */
export async function photosOfLine(
  em: EntityManager,
  options: Viewer & { photoIds: readonly string[] },
): Promise<Photo[]> {
  const found = await rows<PhotoDbRow>(
    em,
    `${PHOTO_SELECT} where ${PHOTO_WALL} and p.id = any($4::uuid[]) order by p.at, p.file_name, p.id`,
    [
      PHOTO_PIPELINE,
      contractorWall(options.ability, 'read', 'Photo'),
      options.actor.orgKind === 'contractor',
      options.photoIds,
    ],
  );
  return found.map((photo) => presentPhoto(photo, options));
}

/** @throws Problem 404 for another contractor's photograph as for none */
export async function readPhoto(em: EntityManager, options: Viewer & { id: string }): Promise<PhotoDbRow> {
  const found = await row<PhotoDbRow>(em, `${PHOTO_SELECT} where ${PHOTO_WALL} and p.id = $4`, [
    PHOTO_PIPELINE,
    contractorWall(options.ability, 'read', 'Photo'),
    options.actor.orgKind === 'contractor',
    options.id,
  ]);
  if (!found) throw notFound();
  return found;
}
