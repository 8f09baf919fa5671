import { PassThrough } from 'node:stream';
import { IsolationLevel } from '@mikro-orm/core';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Services } from '#server/container.ts';
import { row, run } from '#server/db/rows.ts';
import type { JobHandler } from '#server/jobs/define-job.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { queueMail } from '#server/mail/queue-mail.ts';
import { recipients } from '#server/mail/recipients.ts';
import { rememberBlob } from '#server/storage/remember-blob.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import { contentDigest } from './content-digest.ts';
import type { IssueTransmittalPayload } from './issue-transmittal.job.ts';
import { readContent } from './read-content.ts';
import { readCover, type TransmittalHead } from './read-cover.ts';
import { writeAsBuilt } from './write-as-built.ts';

/** No as-built comes near it; a fault that writes without end does. */
const MAX_BYTES = 1024 * 1024 * 1024;
const TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

type Written = { sha256: string; size: number; digest: string; rows: number };

/** Writes the as-built of a transmittal into the blob store and issues it. Repeatable: what is issued is left alone. */
export const issueTransmittal: JobHandler<IssueTransmittalPayload> = async ({ transmittalId }, context) => {
  const { services, em, signal } = context;
  const head = await row<TransmittalHead>(
    em,
    // A failed one comes here again only when an administrator tries its parked job again.
    `update transmittals set state = 'running', problem = null where id = $1 and state <> 'issued'
     returning id, number, revision, title, scope, requested_by`,
    [transmittalId],
  );
  if (!head) return;
  const written = await writeToStore(services, { head, signal });
  await em.transactional((tx) => issue(tx, { head, written }));
};

async function writeToStore(
  services: Services,
  options: { head: TransmittalHead; signal: AbortSignal },
): Promise<Written> {
  const { head, signal } = options;
  // Read twice, digest and then file: one snapshot, so that both see the same.
  return services.orm.em.fork().transactional(
    async (snapshot) => {
      const sheets = readContent(snapshot as EntityManager, head.id);
      const summary = await contentDigest(sheets);
      const cover = await readCover(snapshot as EntityManager, { head, summary });
      const total = ['Set', 'Straighten', 'Re-level'].reduce(
        (sum, name) => sum + (summary.counts.get(name) ?? 0),
        0,
      );
      const target = new PassThrough();
      const stored = services.blobs.putStream(target, { maxBytes: MAX_BYTES, signal });
      const writing = writeAsBuilt(target, {
        cover,
        sheets,
        onRow: (done) =>
          setProgress(services.orm.em.fork(), {
            subject: `transmittal:${head.id}`,
            state: 'running',
            done,
            total,
          }),
      }).catch((error: unknown) => {
        target.destroy(error as Error);
        throw error;
      });
      const [blob] = await Promise.all([stored, writing]);
      return { sha256: blob.sha256, size: blob.size, digest: summary.digest, rows: total };
    },
    { isolationLevel: IsolationLevel.REPEATABLE_READ },
  );
}

async function issue(
  em: EntityManager,
  { head, written }: { head: TransmittalHead; written: Written },
): Promise<void> {
  await rememberBlob(em, { sha256: written.sha256, size: written.size, type: TYPE });
  const issued = await run(
    em,
    `update transmittals set state = 'issued', rows = $2, sha256 = $3, size = $4, content_digest = $5, file_name = $6,
       issued_at = now(), problem = null, version = version + 1 where id = $1 and state = 'running'`,
    [
      head.id,
      written.rows,
      written.sha256,
      written.size,
      written.digest,
      `${head.number}-rev${head.revision}.xlsx`,
    ],
  );
  if (issued === 0) return;
  const label = `${head.number} rev ${head.revision}`;
  const requester = await row<{ id: string; name: string; role: 'clerk' }>(
    em,
    'select id, name, role from users where id = $1',
    [head.requested_by],
  );
  await appendTrail(em, {
    actor: requester,
    action: 'transmittal.issued',
    subject: { type: 'transmittal', id: head.id, label },
    payload: { rows: written.rows, sha256: written.sha256, contentDigest: written.digest },
  });
  await setProgress(em, {
    subject: `transmittal:${head.id}`,
    state: 'done',
    done: written.rows,
    total: written.rows,
  });
  const people = [
    ...(await recipients(em, { role: 'clerk' })),
    ...(await recipients(em, { role: 'auditor' })),
  ];
  for (const recipient of people) {
    await queueMail(em, {
      event: `transmittal.issued:${head.id}`,
      recipient,
      template: 'transmittal-issued',
      data: {
        transmittalId: head.id,
        number: head.number,
        revision: head.revision,
        title: head.title,
        rows: written.rows,
        issuedBy: requester?.name ?? '',
        sha256: written.sha256,
        contentDigest: written.digest,
      },
    });
  }
}
