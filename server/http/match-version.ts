import type { Request } from 'express';
import { problem } from '#server/http/problem.ts';

/**
 * The version in `If-Match: "3"`.
 * @throws Problem 428 when the header is missing, 400 when it is no version
 */
export function matchVersion(req: Request): number {
  const header = req.get('if-match');
  if (header === undefined) {
    throw problem(
      428,
      'version.required',
      'This change must say which version it was made from. Send it in If-Match, as given in the reply or its ETag.',
    );
  }
  return readVersion(header);
}

/**
 * The version of an If-Match that may be left out; null when it was.
 * @throws Problem 400 when it is no version
 */
export function matchVersionIfGiven(req: Request): number | null {
  const header = req.get('if-match');
  return header === undefined ? null : readVersion(header);
}

function readVersion(header: string): number {
  const version = /^(?:W\/)?"?(\d{1,9})"?$/.exec(header.trim())?.[1];
  if (version === undefined) {
    throw problem(400, 'version.unreadable', 'If-Match must be one version number in quotes, such as "3".');
  }
  return Number(version);
}
