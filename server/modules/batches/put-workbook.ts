import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { problem } from '#server/http/problem.ts';
import { rememberBlob } from '#server/storage/remember-blob.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { ReceivedFile } from '#server/uploads/blob-engine.ts';
import type { UploadReply } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { moveRevision } from '#shared/review/revision.ts';
import { accepted } from './accepted.ts';
import { addInput } from './add-input.ts';
import { lockRevision, stateOf } from './lock-revision.ts';

/**
 * Makes a received workbook the newest input of the batch's open revision. The same bytes as the workbook that counts
 * now make no new input; A, then B, then A again are three.
 * @throws Problem 413 or 422 for a file refused by itself, 404, 409 when the revision takes no more files
 */
export async function putWorkbook(
  em: EntityManager,
  options: { batchId: string; contractorId: string | null; actor: Actor; file: ReceivedFile },
): Promise<UploadReply> {
  const { batchId, contractorId, actor, file } = options;
  const { stored } = file;
  if (!stored) {
    const { code, detail } = file.refused ?? {
      code: 'upload.broken',
      detail: 'The file could not be stored.',
    };
    throw problem(code === 'upload.too-large' ? 413 : 422, code, detail);
  }
  return em.transactional(async (tx) => {
    const revision = await lockRevision(tx, { id: batchId, contractorId });
    const moved = accepted(moveRevision(stateOf(revision), { type: 'upload' }, actor));
    const current = await currentWorkbook(tx, revision.id);
    const same = current?.sha256 === stored.sha256 ? current : null;
    const already = same ? { fileName: same.file_name, structureNumber: null } : null;
    const files = (id: string) => [
      { id, fileName: file.fileName, sha256: stored.sha256, already, error: null },
    ];
    if (same) return { input: revision.input, files: files(same.id) };
    await rememberBlob(tx, stored);
    const added = await addInput(
      tx,
      { id: revision.id, input: revision.input, status: moved.status },
      {
        kind: 'workbook',
        sha256: stored.sha256,
        fileName: file.fileName,
        size: stored.size,
        actorId: actor.id,
      },
    );
    await appendTrail(tx, {
      actor,
      action: 'batch.workbook-uploaded',
      subject: { type: 'batch', id: batchId, label: revision.batch_number },
      payload: { revision: revision.n, input: added.n, fileName: file.fileName, sha256: stored.sha256 },
    });
    return { input: added.n, files: files(added.id) };
  });
}

function currentWorkbook(
  em: EntityManager,
  revisionId: string,
): Promise<{ id: string; sha256: string; file_name: string } | null> {
  return row(
    em,
    `select id, sha256, file_name from inputs where revision_id = $1 and kind = 'workbook' order by n desc limit 1`,
    [revisionId],
  );
}
