import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRowsReturning } from '#server/db/insert-rows.ts';
import { rows } from '#server/db/rows.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { preparePhotosJob } from '#server/modules/photos/prepare-photos.job.ts';
import { rememberBlob } from '#server/storage/remember-blob.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { ReceivedFile } from '#server/uploads/blob-engine.ts';
import type { UploadReply } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { moveRevision } from '#shared/review/revision.ts';
import { accepted } from './accepted.ts';
import { addInput } from './add-input.ts';
import { lockRevision, stateOf, type LockedRevision } from './lock-revision.ts';

type PhotoRow = { id: string; sha256: string };
type Known = PhotoRow & { fileName: string; structureNumber: string | null };

/**
 * Adds received photographs to the batch's open revision. A file refused by itself is told beside the others; the
 * same bytes twice in a batch are one photograph.
 * @throws Problem 404, 409 when the revision takes no more files
 */
export async function postPhotos(
  em: EntityManager,
  options: { batchId: string; contractorId: string | null; actor: Actor; files: readonly ReceivedFile[] },
): Promise<UploadReply> {
  const { batchId, contractorId, actor, files } = options;
  return em.transactional(async (tx) => {
    const revision = await lockRevision(tx, { id: batchId, contractorId });
    const moved = accepted(moveRevision(stateOf(revision), { type: 'upload' }, actor));
    const before = await photosBySha(tx, batchId, files);
    const fresh = newFiles(files, before);
    const ids = new Map([...before.values()].map(({ sha256, id }) => [sha256, id]));
    let input = revision.input;
    if (fresh.length > 0) {
      for (const { stored } of fresh) if (stored) await rememberBlob(tx, stored);
      const added = await addInput(
        tx,
        { id: revision.id, input: revision.input, status: moved.status },
        { kind: 'photos', actorId: actor.id },
      );
      input = added.n;
      for (const photo of await insertPhotos(tx, { revision, inputId: added.id, actor, fresh }))
        ids.set(photo.sha256, photo.id);
      await setProgress(tx, { subject: `photos:${batchId}`, state: 'queued', done: 0, total: null });
      await enqueue(tx, preparePhotosJob, { batchId });
      await appendTrail(tx, {
        actor,
        action: 'batch.photos-uploaded',
        subject: { type: 'batch', id: batchId, label: revision.batch_number },
        payload: { revision: revision.n, input, photographs: fresh.length },
      });
    }
    return {
      input,
      files: files.map((file) => {
        const { fileName, stored, refused } = file;
        return {
          id: stored ? (ids.get(stored.sha256) ?? null) : null,
          fileName,
          sha256: stored?.sha256 ?? null,
          already: stored ? alreadyAs(file, { before: before.get(stored.sha256), fresh }) : null,
          error: refused ? { code: refused.code, detail: refused.detail } : null,
        };
      }),
    };
  });
}

/** Of this batch only: that another batch has the same bytes is told to nobody here. */
async function photosBySha(
  em: EntityManager,
  batchId: string,
  files: readonly ReceivedFile[],
): Promise<Map<string, Known>> {
  const found = await rows<Known>(
    em,
    `select p.id, p.sha256, p.file_name as "fileName",
       case when not m.removed then l.structure_number end as "structureNumber"
     from photos p
     left join lateral (select * from photo_matches x where x.photo_id = p.id order by x.seq desc limit 1) m on true
     left join lines l on l.id = m.line_id
     where p.batch_id = $1 and p.sha256 = any($2)`,
    [batchId, files.flatMap((file) => (file.stored ? [file.stored.sha256] : []))],
  );
  return new Map(found.map((photo) => [photo.sha256, photo]));
}

/** As what the same bytes came before this file: in the batch, or earlier in the same upload. */
function alreadyAs(
  file: ReceivedFile,
  { before, fresh }: { before: Known | undefined; fresh: readonly ReceivedFile[] },
): { fileName: string; structureNumber: string | null } | null {
  if (before) return { fileName: before.fileName, structureNumber: before.structureNumber };
  const first = fresh.find((one) => one.stored?.sha256 === file.stored?.sha256);
  return first && first !== file ? { fileName: first.fileName, structureNumber: null } : null;
}

function newFiles(files: readonly ReceivedFile[], known: ReadonlyMap<string, Known>): ReceivedFile[] {
  const bySha = new Map<string, ReceivedFile>();
  for (const file of files)
    if (file.stored && !known.has(file.stored.sha256) && !bySha.has(file.stored.sha256))
      bySha.set(file.stored.sha256, file);
  return [...bySha.values()];
}

function insertPhotos(
  em: EntityManager,
  photos: { revision: LockedRevision; inputId: string; actor: Actor; fresh: readonly ReceivedFile[] },
): Promise<PhotoRow[]> {
  const { revision, inputId, actor, fresh } = photos;
  return insertRowsReturning<PhotoRow>(em, {
    table: 'photos',
    list: fresh.map((file) => ({
      batch_id: revision.batch_id,
      revision_id: revision.id,
      input_id: inputId,
      sha256: file.stored?.sha256,
      file_name: file.fileName,
      actor_id: actor.id,
    })),
    returning: ['id', 'sha256'],
  });
}
