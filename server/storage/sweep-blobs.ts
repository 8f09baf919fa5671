import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows, run } from '#server/db/rows.ts';
import type { JobHandler } from '#server/jobs/define-job.ts';
import type { BlobStore } from '#server/storage/blob-store.ts';

/** No upload, and no transaction that will refer to it, takes so long. */
const AGE_MS = 24 * 3_600_000;
const PAGE = 500;

export const sweepBlobs: JobHandler<object> = async (_payload, { services, em, signal }) => {
  const before = new Date(Date.now() - AGE_MS);
  const swept = await sweep({ em, blobs: services.blobs, before, signal });
  services.log.info(swept, 'blobs swept');
};

/** Takes what nothing refers to and nobody wrote, saw or referred to since `before`. */
export async function sweep(options: {
  em: EntityManager;
  blobs: BlobStore;
  before: Date;
  signal?: AbortSignal;
}): Promise<{ unreferenced: number; unknown: number; incoming: number }> {
  const { em, blobs, before, signal } = options;
  const swept = { unreferenced: 0, unknown: 0, incoming: 0 };
  const unused = await unusedCondition(em);
  let after = '';
  for (;;) {
    const page = await rows<{ sha256: string }>(
      em,
      `select sha256 from blobs where sha256 > $1 and referenced_at < $2 and ${unused} order by sha256 limit $3`,
      [after, before, PAGE],
    );
    for (const { sha256 } of page) {
      signal?.throwIfAborted();
      if (await sweepOne({ em, blobs, before, sha256, unused })) swept.unreferenced += 1;
    }
    if (page.length < PAGE) break;
    after = page.at(-1)?.sha256 ?? after;
  }
  for await (const item of blobs.list()) {
    signal?.throwIfAborted();
    if (item.changedAt >= before) continue;
    if (item.sha256 === null) {
      if (item.name.startsWith('incoming/') && (await blobs.deleteIncoming(item.name, before)))
        swept.incoming += 1;
    } else if ((await row(em, 'select 1 from blobs where sha256 = $1', [item.sha256])) === null) {
      if (await blobs.deleteIfOld(item.sha256, before)) swept.unknown += 1;
    }
  }
  return swept;
}

/** The row is held while its blob goes, so that whoever comes to refer to it waits and then writes a row of their own. */
function sweepOne(options: {
  em: EntityManager;
  blobs: BlobStore;
  before: Date;
  sha256: string;
  unused: string;
}): Promise<boolean> {
  const { em, blobs, before, sha256, unused } = options;
  return em.transactional(async (tx) => {
    const found = await row(
      tx,
      `select 1 from blobs where sha256 = $1 and referenced_at < $2 and ${unused} for update skip locked`,
      [sha256, before],
    );
    if (found === null || !(await blobs.deleteIfOld(sha256, before))) return false;
    await run(tx, 'delete from blobs where sha256 = $1', [sha256]);
    return true;
  });
}

/** Asked of the database, so that a column added later is not forgotten here. */
async function unusedCondition(em: EntityManager): Promise<string> {
  const columns = await rows<{ table: string; column: string }>(
    em,
    `select quote_ident(c.relname) as table, quote_ident(a.attname) as column
     from pg_constraint f join pg_class c on c.oid = f.conrelid
     join pg_attribute a on a.attrelid = f.conrelid and a.attnum = f.conkey[1]
     where f.contype = 'f' and f.confrelid = 'blobs'::regclass`,
  );
  if (columns.length === 0) throw new Error('No column refers to blobs: nothing can be told unreferenced.');
  return columns
    .map(({ table, column }) => `not exists (select from ${table} where ${column} = blobs.sha256)`)
    .join(' and ');
}
