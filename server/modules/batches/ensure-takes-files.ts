import type { EntityManager } from '@mikro-orm/postgresql';
import type { Request } from 'express';
import { discardBody } from '#server/uploads/receive-files.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { moveRevision } from '#shared/review/revision.ts';
import { accepted } from './accepted.ts';
import { revisionState } from './batch-can.ts';
import { readBatch } from './read-batch.ts';

/**
 * Looks before a file is read whether the batch takes any: nothing of a stranger's upload is stored. It is looked at
 * again, under lock, when the files are in.
 * @throws Problem 404, 409
 */
export async function ensureTakesFiles(
  em: EntityManager,
  upload: {
    req: Request;
    batchId: string;
    contractorId: string | null;
    actor: Actor;
    /** It was answered before: what the batch has become since is no reason to refuse the same answer. */
    repeated: boolean;
  },
): Promise<void> {
  try {
    const batch = await readBatch(em, { id: upload.batchId, contractorId: upload.contractorId });
    if (!upload.repeated) accepted(moveRevision(revisionState(batch), { type: 'upload' }, upload.actor));
  } catch (error) {
    discardBody(upload.req);
    throw error;
  }
}
