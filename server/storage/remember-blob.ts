import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';

/** The row that everything that refers to a blob hangs on; call it in the transaction that writes the reference, before that reference. */
export async function rememberBlob(
  em: EntityManager,
  blob: { readonly sha256: string; readonly size: number; readonly type?: string | null },
): Promise<void> {
  await run(
    em,
    `insert into blobs (sha256, size, type) values ($1, $2, $3)
     on conflict (sha256) do update set referenced_at = now(), type = coalesce(blobs.type, excluded.type)`,
    [blob.sha256, blob.size, blob.type ?? null],
  );
}
