import { rmSync } from 'node:fs';
import { createServer, type RequestListener } from 'node:http';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import pg from 'pg';
import type { TestProject } from 'vitest/node';
import { newAccountKey, startAzurite } from '#scripts/lib/azurite.mjs';
import { freePort } from '#scripts/lib/free-port.mjs';
import { newPasswords, startPostgres } from '#scripts/lib/postgres.mjs';
import { tempFolder } from '#scripts/lib/temp-folder.mjs';
import { migrate } from '#server/db/migrate.ts';
import { databaseUrl } from './database-url.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** Address that stops and starts the stores on request; see tests/faults/setup/stores.ts. */
    storesControl: string;
  }
}

const TEMPLATE = 'faults_template';

/** A cluster and a blob store that nobody else uses, on ports they keep, so that tests may stop and start them. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const folder = tempFolder('upstand-faults-');
  const postgres = {
    dir: path.join(folder, 'pg'),
    port: await freePort(),
    durable: false,
    passwords: newPasswords(),
  };
  const azurite = { dir: path.join(folder, 'blobs'), port: await freePort(), accountKey: newAccountKey() };
  let cluster = await startPostgres(postgres);
  let blobs = await startAzurite(azurite);
  const acts: Readonly<Record<string, () => Promise<void>>> = {
    '/postgres/stop': () => cluster.stop(),
    '/postgres/start': async () => void (cluster = await startPostgres(postgres)),
    '/blobs/stop': () => blobs.stop(),
    '/blobs/start': async () => void (blobs = await startAzurite(azurite)),
  };
  const control = createServer(answerBy(acts));
  await new Promise<void>((resolve) => control.listen(0, '127.0.0.1', resolve));
  const stop = async () => {
    control.close();
    await blobs.stop();
    await cluster.stop();
    rmSync(folder, { recursive: true, force: true });
  };
  try {
    await makeTemplate(cluster.url);
    project.provide('services', {
      ownerUrl: cluster.url,
      appUrl: cluster.appUrl,
      storage: blobs.connectionString,
      template: TEMPLATE,
    });
    project.provide('storesControl', `http://127.0.0.1:${(control.address() as AddressInfo).port}`);
    return stop;
  } catch (error) {
    await stop();
    throw error;
  }
}

async function makeTemplate(ownerUrl: string): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  await client.query(`create database ${TEMPLATE}`);
  await client.end();
  await migrate(databaseUrl(ownerUrl, TEMPLATE));
}

const answerBy =
  (acts: Readonly<Record<string, () => Promise<void>>>): RequestListener =>
  (req, res) => {
    const act = acts[req.url ?? ''];
    if (!act) return void res.writeHead(404).end();
    return void act().then(
      () => res.writeHead(204).end(),
      (error: unknown) => res.writeHead(500).end(String(error)),
    );
  };
