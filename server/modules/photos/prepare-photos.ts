import { rm } from 'node:fs/promises';
import { join } from 'node:path';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Services } from '#server/container.ts';
import { rows, run } from '#server/db/rows.ts';
import type { JobHandler } from '#server/jobs/define-job.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { BlobMissing } from '#server/storage/blob-store.ts';
import { rememberBlob } from '#server/storage/remember-blob.ts';
import { withTempFolder } from '#server/uploads/temp-folder.ts';
import { finishPhotos } from './finish-photos.ts';
import type { PictureAnswer } from './picture-messages.ts';
import { PictureProcess } from './picture-process.ts';
import { PHOTO_PIPELINE } from './pipeline.ts';
import type { PreparePhotosPayload } from './prepare-photos.job.ts';

const DISPLAY_BYTES = 20_000_000;

/** Every photograph of the batch that has no facts yet, one at a time; each is kept when it is done, so that a repeat goes on from there. */
export const preparePhotos: JobHandler<PreparePhotosPayload> = async (
  { batchId },
  { services, em, signal },
) => {
  const waiting = await rows<{ sha256: string }>(
    em,
    `select distinct p.sha256 from photos p
     where p.batch_id = $1 and not exists (
       select 1 from photo_facts f where f.sha256 = p.sha256 and f.pipeline = $2
     )`,
    [batchId, PHOTO_PIPELINE],
  );
  const total = waiting.length;
  const subject = `photos:${batchId}`;
  if (total === 0) return finishPhotos(em, { batchId, problem: null });
  await setProgress(em, { subject, state: 'running', done: 0, total });
  const missing: string[] = [];
  const process = new PictureProcess();
  try {
    await withTempFolder('upstand-photos-', async (folder) => {
      for (const [index, { sha256 }] of waiting.entries()) {
        if (!(await preparePhoto({ em, services, process, folder, sha256, signal }))) missing.push(sha256);
        await run(
          em,
          // An attempt that was taken for dead, and is not, must not open what another has ended.
          `update job_progress set state = 'running', done = $2, total = $3, updated_at = now()
           where subject = $1 and state in ('queued', 'running')`,
          [subject, index + 1, total],
        );
      }
    });
  } finally {
    process.close();
  }
  if (missing.length > 0)
    throw new Error(
      `The store of files lacks the bytes of ${missing.length} photographs: ${missing.join(', ')}.`,
    );
  return finishPhotos(em, { batchId, problem: null });
};

/** False: the store lacks its bytes. The others are prepared all the same. */
async function preparePhoto(options: {
  em: EntityManager;
  services: Services;
  process: PictureProcess;
  folder: string;
  sha256: string;
  signal: AbortSignal;
}): Promise<boolean> {
  const { em, services, process, folder, sha256, signal } = options;
  const files = {
    source: join(folder, 'source'),
    thumb: join(folder, 'thumb.jpg'),
    display: join(folder, 'display.jpg'),
  };
  try {
    await services.blobs.readTo(sha256, files.source, { signal });
    const answer = await process.decode(files, signal);
    await keep({ em, services, sha256, answer, files, signal });
    return true;
  } catch (error) {
    if (!(error instanceof BlobMissing)) throw error;
    return false;
  } finally {
    for (const path of Object.values(files)) await rm(path, { force: true });
  }
}

async function keep(options: {
  em: EntityManager;
  services: Services;
  sha256: string;
  answer: PictureAnswer;
  files: { thumb: string; display: string };
  signal: AbortSignal;
}): Promise<void> {
  const { em, services, sha256, answer, files, signal } = options;
  const put = (path: string) => services.blobs.putFile(path, { maxBytes: DISPLAY_BYTES, signal });
  const shown =
    answer.type === 'facts' ? { thumb: await put(files.thumb), display: await put(files.display) } : null;
  const facts = answer.type === 'facts' ? answer.facts : null;
  const problem = answer.type === 'problem' ? { code: answer.code, detail: answer.detail } : null;
  await em.transactional(async (tx) => {
    if (shown) {
      await rememberBlob(tx, { ...shown.thumb, type: 'image/jpeg' });
      await rememberBlob(tx, { ...shown.display, type: 'image/jpeg' });
    }
    await run(
      tx,
      `insert into photo_facts (sha256, pipeline, type, width, height, taken_wall, taken_at, latitude, longitude,
         thumb_sha256, display_sha256, problem)
       values ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10, $11, $12) on conflict (sha256, pipeline) do nothing`,
      [
        sha256,
        PHOTO_PIPELINE,
        facts?.type ?? null,
        facts?.width ?? null,
        facts?.height ?? null,
        facts?.takenWall ?? null,
        facts?.takenAt ?? null,
        facts?.latitude ?? null,
        facts?.longitude ?? null,
        shown?.thumb.sha256 ?? null,
        shown?.display.sha256 ?? null,
        problem === null ? null : JSON.stringify(problem),
      ],
    );
  });
}
