import type { RouteContext } from '#server/http/define-route.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { HEAD_BYTES, pictureType } from '#server/modules/photos/picture-type.ts';
import { receiveFiles } from '#server/uploads/receive-files.ts';
import type { UploadReply } from '#shared/generated/api-types.ts';
import { ensureTakesFiles } from './ensure-takes-files.ts';
import { answerUploadOnce, readUploadKey } from './answer-upload-once.ts';
import { postPhotos } from './post-photos.ts';

const MOST_BYTES = 40_000_000;
const MOST_FILES = 500;

/** Receives photographs of a batch; each is taken or refused by itself. */
export async function uploadPhotos(ctx: RouteContext): Promise<UploadReply> {
  const { em, req, res, actor, ability, services } = ctx;
  const where = { batchId: ctx.params.id, contractorId: contractorWall(ability, 'hand-in', 'Batch'), actor };
  const key = await readUploadKey(em, { req, actor });
  await ensureTakesFiles(em, { req, ...where, repeated: key.repeated });
  const files = await receiveFiles({
    req,
    res,
    field: 'photos',
    maxFiles: MOST_FILES,
    blobs: services.blobs,
    maxBytes: MOST_BYTES,
    headBytes: HEAD_BYTES,
    admit: pictureType,
    tooLarge: {
      code: 'photo.too-large',
      detail: `The picture is larger than ${MOST_BYTES / 1_000_000} MB. Save it smaller as JPEG and upload it again.`,
    },
  });
  return answerUploadOnce(ctx, { key, files, first: (tx) => postPhotos(tx, { ...where, files }) });
}
