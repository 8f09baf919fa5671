import type { Request, Response } from 'express';
import multer, { MulterError } from 'multer';
import { problem, type Problem } from '#server/http/problem.ts';
import { BlobRefused } from '#server/storage/blob-store.ts';
import { blobEngine, type EngineOptions, type ReceivedFile } from './blob-engine.ts';

export type ReceiveOptions = Omit<EngineOptions, 'received'> & {
  readonly req: Request;
  readonly res: Response;
  /** Name of the form's field. */
  readonly field: string;
  readonly maxFiles: number;
};

/**
 * Reads a multipart request to its end; files go to the blob store as they come, in the order of the request.
 * @throws Problem 415 not multipart, 400 broken off, another field or no file, 413 too many files, 503 a store that takes nothing
 */
export async function receiveFiles(options: ReceiveOptions): Promise<readonly ReceivedFile[]> {
  const { req, res, field, maxFiles } = options;
  if (!req.is('multipart/form-data'))
    throw problem(415, 'upload.not-multipart', 'Send the file as a form (multipart/form-data).');
  const received: ReceivedFile[] = [];
  const parse = multer({
    storage: blobEngine({ ...options, received }),
    defParamCharset: 'utf8',
    // Path parts are taken off by safeFileName; what is nothing but path is still a file.
    preservePath: true,
    // The engine counts bytes itself, so that one file too large does not lose the others; this is the outer wall.
    limits: {
      fileSize: options.maxBytes * 4,
      files: maxFiles,
      fields: 0,
      fieldNameSize: 100,
      fieldSize: 1_000,
      parts: maxFiles,
      headerPairs: 100,
    },
  }).array(field, maxFiles);
  await new Promise<void>((resolve, reject) => {
    parse(req, res, (error: unknown) => {
      if (error) reject(uploadProblem(error, { field, maxFiles }));
      else resolve();
    });
  });
  if (received.length === 0)
    throw problem(
      400,
      'upload.missing',
      `There is no file in the form’s field “${field}”. Choose a file and upload again.`,
    );
  return received;
}

/** Lets the rest of a refused upload run out, so that the sender gets to read the answer. */
export function discardBody(req: Request): void {
  req.resume();
}

function uploadProblem(error: unknown, asked: { field: string; maxFiles: number }): Error | Problem {
  if (error instanceof MulterError) {
    switch (error.code) {
      case 'LIMIT_FILE_COUNT':
      case 'LIMIT_PART_COUNT':
        return problem(
          413,
          'upload.too-many',
          `At most ${asked.maxFiles} files go in one upload. Send the others after it.`,
        );
      case 'LIMIT_UNEXPECTED_FILE':
        return problem(400, 'upload.field', `Files are expected in the form’s field “${asked.field}” only.`);
      case 'LIMIT_FILE_SIZE':
        return problem(
          413,
          'upload.too-large',
          'The file is far larger than this takes. Nothing was stored.',
        );
      default:
        return problem(400, 'upload.broken', 'The form cannot be read. Upload the file again.');
    }
  }
  if (error instanceof BlobRefused)
    return problem(
      503,
      'storage.refused',
      'The store of files behind this site does not take the file just now; it may be full. Nothing was changed. Upload it again in a few minutes; if it goes on, tell the administrator.',
      { headers: { 'Retry-After': '60' } },
    );
  const message = error instanceof Error ? error.message : '';
  if (/Malformed part header/iu.test(message))
    return problem(
      400,
      'upload.name',
      'The name of a file has a character that cannot be sent, such as a line end or another control character. Rename the file and upload it again. Nothing was stored.',
    );
  if (/Unexpected end of form|Request aborted|Malformed|Multipart|aborted|premature/iu.test(message))
    return problem(
      400,
      'upload.broken',
      'The upload broke off before its end. Nothing was changed; upload it again.',
    );
  return error instanceof Error ? error : new Error('upload failed', { cause: error });
}
