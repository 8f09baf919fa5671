import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { endWithParentArgs, startChild } from './child.mjs';
import { freePort } from './free-port.mjs';
import { waitForPort } from './wait-for.mjs';

const ACCOUNT = 'upstand';
const ROOT = fileURLToPath(new URL('../../', import.meta.url));
const MAIN = path.join(ROOT, 'node_modules/azurite/dist/src/blob/main.js');

/**
 * Starts the local blob store on loopback, keeping its blobs in `dir`. It ends with our process.
 * @param {{dir: string, port?: number, accountKey?: string, logFile?: string}} options
 *   `accountKey` is base64; a new one each time when left out.
 */
export async function startAzurite({ dir, port, accountKey = newAccountKey(), logFile }) {
  if (!existsSync(MAIN)) throw new Error('Azurite is not installed. Run: npm ci');
  mkdirSync(dir, { recursive: true, mode: 0o700 });
  const at = port ?? (await freePort());
  const options = ['--blobHost', '127.0.0.1', '--blobPort', String(at), '--location', path.resolve(dir)];
  const server = startChild({
    name: 'Azurite',
    command: process.execPath,
    // Without --skipApiVersionCheck it refuses the current SDK.
    args: [...endWithParentArgs, MAIN, ...options, '--silent', '--disableTelemetry', '--skipApiVersionCheck'],
    env: { ...process.env, AZURITE_ACCOUNTS: `${ACCOUNT}:${accountKey}` },
    logFile,
  });
  try {
    await waitForPort(at, { giveUp: server.failure });
  } catch (error) {
    await server.stop();
    throw error;
  }
  const endpoint = `http://127.0.0.1:${at}/${ACCOUNT}`;
  return {
    connectionString: `DefaultEndpointsProtocol=http;AccountName=${ACCOUNT};AccountKey=${accountKey};BlobEndpoint=${endpoint};`,
    port: at,
    pid: server.pid,
    ended: server.ended,
    failure: server.failure,
    stop: () => server.stop(),
  };
}

export function newAccountKey() {
  return randomBytes(64).toString('base64');
}
