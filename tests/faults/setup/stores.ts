import { inject } from 'vitest';

async function ask(act: string): Promise<void> {
  const reply = await fetch(`${inject('storesControl')}${act}`, { method: 'POST' });
  if (!reply.ok) throw new Error(`The store did not do ${act}: ${await reply.text()}`);
}

/** As an administrator restarts it: connections are ended, open transactions roll back. */
export async function restartPostgres(): Promise<void> {
  await ask('/postgres/stop');
  await ask('/postgres/start');
}
export const stopBlobs = (): Promise<void> => ask('/blobs/stop');
export const startBlobs = (): Promise<void> => ask('/blobs/start');
