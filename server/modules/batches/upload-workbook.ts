import type { RouteContext } from '#server/http/define-route.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { matchVersionIfGiven } from '#server/http/match-version.ts';
import { receiveFiles } from '#server/uploads/receive-files.ts';
import type { UploadReply } from '#shared/generated/api-types.ts';
import { READER_LIMITS } from '#shared/workbook/limits.ts';
import { answerUploadOnce, readUploadKey } from './answer-upload-once.ts';
import { ensureTakesFiles } from './ensure-takes-files.ts';
import { ensureVersion } from './ensure-version.ts';
import { putWorkbook } from './put-workbook.ts';

/** Receives the workbook of a batch. What kind of file it is, the check says; an empty or too large one is refused here. */
export async function uploadWorkbook(ctx: RouteContext): Promise<UploadReply> {
  const { em, req, res, actor, ability, services } = ctx;
  const where = { batchId: ctx.params.id, contractorId: contractorWall(ability, 'hand-in', 'Batch'), actor };
  const key = await readUploadKey(em, { req, actor });
  await ensureTakesFiles(em, { req, ...where, repeated: key.repeated });
  const [file] = await receiveFiles({
    req,
    res,
    field: 'workbook',
    maxFiles: 1,
    blobs: services.blobs,
    maxBytes: READER_LIMITS.fileBytes,
    headBytes: 1,
    admit: (head) =>
      head.length === 0
        ? {
            code: 'upload.empty',
            detail: 'The file is empty. Choose the workbook again, and wait until it has been copied whole.',
          }
        : { type: null },
    tooLarge: {
      code: 'upload.too-large',
      detail: `The workbook is larger than ${READER_LIMITS.fileBytes / 1_000_000} MB. Remove pictures from it; photographs are uploaded apart.`,
    },
  });
  const version = matchVersionIfGiven(req);
  if (!file) throw new Error('An upload ended without a file and without saying why.');
  return answerUploadOnce(ctx, {
    key,
    files: [file],
    first: async (tx) => {
      if (version !== null) await ensureVersion(tx, { ...where, ability, version });
      return putWorkbook(tx, { ...where, file });
    },
  });
}
