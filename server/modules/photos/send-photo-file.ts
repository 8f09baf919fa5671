import { pipeline } from 'node:stream/promises';
import type { RouteContext } from '#server/http/define-route.ts';
import { problem } from '#server/http/problem.ts';
import { readPhoto } from './list-photos.ts';
import type { PhotoDbRow } from './photo-select.ts';

export type PhotoSize = 'thumb' | 'display' | 'original';

/**
 * Streams a photograph: a size written anew for the screen, or the original byte for byte as a download.
 * @throws Problem 404 for another contractor's photograph, and while a size is not there
 */
export async function sendPhotoFile(ctx: RouteContext<{ query: { size?: PhotoSize } }>): Promise<void> {
  const { em, actor, ability, services, req, res } = ctx;
  const photo = await readPhoto(em, { id: ctx.params.id, actor, ability });
  const size = ctx.query.size ?? 'display';
  const sha256 = shaOf(photo, size);
  const etag = `"${sha256}"`;
  // Only the browser of the person who may see it keeps it, and asks again before it shows it.
  res.set({ 'Cache-Control': 'private, no-cache', ETag: etag, 'X-Content-Type-Options': 'nosniff' });
  if (req.get('if-none-match') === etag) {
    res.status(304).end();
    return;
  }
  res.type(size === 'original' ? (photo.type ?? 'application/octet-stream') : 'image/jpeg');
  if (size === 'original') res.attachment(photo.file_name).type(photo.type ?? 'application/octet-stream');
  await pipeline(await services.blobs.openRead(sha256), res);
}

function shaOf(photo: PhotoDbRow, size: PhotoSize): string {
  if (size === 'original') return photo.sha256;
  const sha256 = size === 'thumb' ? photo.thumb_sha256 : photo.display_sha256;
  if (sha256) return sha256;
  throw photo.problem
    ? problem(404, photo.problem.code, photo.problem.detail)
    : problem(404, 'photo.not-ready', 'The picture is still being prepared. Try again in a moment.');
}
