import { afterAll, beforeAll, expect, it } from 'vitest';
import { createServices, type Services } from '#server/container.ts';
import { row, rows, run } from '#server/db/rows.ts';
import { startCapture, type Capture } from '#server/mail/capture-server.ts';
import { listCaptured, readCaptured } from '#server/mail/captured-mail.ts';
import { queueMail } from '#server/mail/queue-mail.ts';
import { startWorker } from '#server/worker.ts';
import { cloneDatabase, type TestDatabase } from '#tests/setup/clone-database.ts';
import { drainJobs } from '#tests/setup/drain-jobs.ts';
import { testConfig } from '#tests/setup/test-config.ts';

let database: TestDatabase;
let services: Services;
let capture: Capture | null;
let done: () => void;
const em = () => services.orm.em.fork();

beforeAll(async () => {
  database = await cloneDatabase();
  const made = await testConfig(database);
  done = made.done;
  services = await createServices(made.config);
  capture = await startCapture(services);
});
afterAll(async () => {
  await capture?.close();
  await services.close();
  await database.drop();
  done();
});

async function work(): Promise<void> {
  const worker = await startWorker(services);
  await drainJobs(services.pool);
  await worker.stop();
}

const LINK = 'http://127.0.0.1:4600/password-reset/secret-token';
const DATA = { name: 'Ana', owner: 'Larkmoor', link: LINK, validFor: 'one hour' };

function mail(event: string) {
  return em().transactional((tx) =>
    queueMail(tx, {
      event,
      recipient: { name: 'Ana <b>Núñez</b>', address: 'Ana@Brindle.example' },
      template: 'password-reset',
      data: DATA,
    }),
  );
}

it('a message queued twice is sent once, under the Message-ID that the outbox keeps', async () => {
  await mail('password-reset:1');
  await mail('password-reset:1');
  await work();
  const sent = await listCaptured(em(), { limit: 10 });
  expect(sent).toMatchObject([
    { subject: 'A new password for Upstand', recipients: ['ana@brindle.example'] },
  ]);
  const message = await readCaptured(em(), sent[0]?.id ?? '');
  const kept = await row<{ message_id: string; state: string; data: object }>(
    em(),
    'select message_id, state, data from outbox',
  );
  expect(message?.messageId).toBe(kept?.message_id);
  expect(kept).toMatchObject({ state: 'sent', data: { name: 'Ana', validFor: 'one hour' } });
  expect(kept?.data).not.toHaveProperty('link');
  expect(message?.text).toContain(LINK);
  expect(message?.html).toContain(`<a href="${LINK}"`);
});

it('a repeat of the job after it was sent sends nothing; a repeat after a crash before our note sends the same message', async () => {
  await run(em(), 'delete from captured_mail');
  await mail('password-reset:2');
  await work();
  const [outbox] = await rows<{ id: string; message_id: string }>(
    em(),
    `select id, message_id from outbox where event = 'password-reset:2'`,
  );
  const again = () => services.queue.boss.send('send-mail', { outboxId: outbox?.id });
  await again();
  await work();
  expect(await listCaptured(em(), { limit: 10 })).toHaveLength(1);

  await run(em(), `update outbox set state = 'queued', data = data || '{"token":"t"}' where id = $1`, [
    outbox?.id,
  ]);
  await again();
  await work();
  const ids = await rows(em(), 'select distinct message_id from captured_mail');
  expect(ids).toEqual([{ message_id: outbox?.message_id }]);
});

it('a message of a transaction that was rolled back is never sent', async () => {
  await run(em(), 'delete from captured_mail');
  const refused = em().transactional(async (tx) => {
    await queueMail(tx, {
      event: 'password-reset:3',
      recipient: { name: 'Ana', address: 'ana@brindle.example' },
      template: 'password-reset',
      data: DATA,
    });
    throw new Error('rolled back on purpose');
  });
  await expect(refused).rejects.toThrow('rolled back on purpose');
  await work();
  expect(await listCaptured(em(), { limit: 10 })).toEqual([]);
});

it('a mail server that is down loses nothing: the message waits with the reason and is sent when it is back', async () => {
  await run(em(), 'delete from captured_mail');
  await capture?.close();
  await mail('password-reset:4');
  await work();
  expect(await row(em(), `select state, attempts from outbox where event = 'password-reset:4'`)).toEqual({
    state: 'queued',
    attempts: 1,
  });
  const waiting = await row<{ last_error: string }>(
    em(),
    `select last_error from outbox where event = 'password-reset:4'`,
  );
  expect(waiting?.last_error).toContain('ECONNREFUSED');
  capture = await startCapture(services);
  await run(em(), `update pgboss.job set start_after = now() where state = 'retry'`);
  await work();
  expect(await listCaptured(em(), { limit: 10 })).toHaveLength(1);
});
