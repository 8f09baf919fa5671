import path from 'node:path';
import { StartProblem } from './problem.mjs';

/**
 * What the start itself reads from the environment; the server reads and checks the rest.
 * @param {NodeJS.ProcessEnv} env
 * @param {string} root the project's folder, which a relative DATA_DIR is taken from
 */
export function readStartSettings(env, root) {
  const port = readPort(env.PORT);
  const databaseUrl = blankIsNull(env.DATABASE_URL);
  const storage = blankIsNull(env.AZURE_STORAGE_CONNECTION_STRING);
  return {
    port,
    url: `http://127.0.0.1:${port}`,
    dataDir: path.resolve(root, blankIsNull(env.DATA_DIR) ?? 'var'),
    databaseUrl,
    storage,
    smtpUrl: blankIsNull(env.SMTP_URL),
  };
}

function readPort(text) {
  if (blankIsNull(text) === null) return 4600;
  const port = /^\d+$/.test(text.trim()) ? Number(text) : 0;
  if (port >= 1 && port <= 65_535) return port;
  throw new StartProblem(
    `PORT is “${text}”; it must be a whole number from 1 to 65535.`,
    'For example: PORT=4610 npm start',
  );
}

function blankIsNull(text) {
  return text === undefined || text.trim() === '' ? null : text.trim();
}
