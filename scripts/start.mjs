import { mkdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { startAzurite } from './lib/azurite.mjs';
import { startChild, endWithParentArgs } from './lib/child.mjs';
import { ensureClientBuild } from './lib/client-build.mjs';
import { freePort, portIsFree } from './lib/free-port.mjs';
import { ensureNodePackages } from './lib/node-packages.mjs';
import { portOwner } from './lib/port-owner.mjs';
import { startPostgres } from './lib/postgres.mjs';
import { StartProblem, printProblem } from './lib/problem.mjs';
import { endRunning, run } from './lib/run.mjs';
import { readSecrets } from './lib/secrets.mjs';
import { serverFlags } from './lib/server-flags.mjs';
import { runningServices } from './lib/services-running.mjs';
import { takeDataFolder } from './lib/start-lock.mjs';
import { readStartSettings } from './lib/start-settings.mjs';
import { formatSeconds, step } from './lib/step.mjs';
import { waitFor } from './lib/wait-for.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const services = runningServices();
let releaseFolder = () => {};
let ending = null;

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(signal, () => {
    if (ending) process.exit(1); // a second Ctrl-C does not wait; what we started ends with us
    console.log('\nEnding …');
    void end(0);
  });
}

try {
  await start();
} catch (error) {
  if (!ending) {
    printProblem(error);
    await end(1);
  }
}

async function end(code) {
  ending ??= (async () => {
    endRunning();
    await services.stopAll().catch(printProblem);
    releaseFolder();
    process.exit(code);
  })();
  await ending;
}

async function start() {
  const began = performance.now();
  checkNode();
  const settings = readStartSettings(process.env, root);
  releaseFolder = takeDataFolder(settings.dataDir, { url: settings.url });
  await checkPort(settings.port);
  console.log(`Upstand starts; its data are in ${settings.dataDir}\n`);

  await step('npm packages', async (say) => {
    say((await ensureNodePackages(root)) ? 'installed by the lock file' : 'already in place');
  });
  const secrets = readSecrets(settings.dataDir);
  const logs = path.join(settings.dataDir, 'logs');
  mkdirSync(logs, { recursive: true, mode: 0o700 });
  const env = await startStores({ settings, secrets, logs });
  await step('Tables', () =>
    run(process.execPath, ['--import', 'tsx', 'server/db/migrate.ts'], { cwd: root, env }),
  );
  await step('Client', async (say) =>
    say((await ensureClientBuild(root)) ? 'built' : 'already built from these sources'),
  );
  await step('Child processes', async (say) => {
    // By import here: the packages were perhaps not there when this program began.
    const { buildChildPrograms } = await import('./lib/child-programs.mjs');
    env.CHILD_PROGRAMS = await buildChildPrograms(root);
    say('built');
  });
  const server = await step('Server', () =>
    startServer({ settings, env, logFile: path.join(logs, 'server.log') }),
  );
  const seeded = await seedOnce({ settings, env });

  tellReady({ settings, secrets, seeded, logs, seconds: (performance.now() - began) / 1000 });
  const failure = await services.firstFailure();
  if (ending) return;
  throw new StartProblem(
    `${failure.message}\n\nThe rest was ended too; nothing that was stored is lost.`,
    `Start again with: npm start${failure.message.startsWith(server.name) ? `\nThe server’s log: ${path.join(logs, 'server.log')}` : ''}`,
  );
}

function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 11)) return;
  throw new StartProblem(`Node.js ${process.versions.node} is too old.`, 'Install Node.js 20.11 or later.');
}

async function checkPort(port) {
  if (await portIsFree(port)) return;
  const owner = portOwner(port);
  throw new StartProblem(
    `Port ${port} cannot be used: ${owner ? `${owner} listens on it` : 'something listens on it, or this account may not'}.`,
    `End that, or choose another port: PORT=${port === 4610 ? 4620 : 4610} npm start`,
  );
}

/** PostgreSQL and the blob store: ours, unless the environment points at others. Gives the server's environment. */
async function startStores({ settings, secrets, logs }) {
  const { dataDir } = settings;
  const env = { ...process.env, TZ: 'UTC', PORT: String(settings.port), DATA_DIR: dataDir };
  if (!settings.smtpUrl) {
    env.SMTP_URL = `smtp://127.0.0.1:${await freePort()}`;
    env.CAPTURE_MAIL = '1'; // the server keeps the messages itself and shows them to the administrator
  }
  if (settings.databaseUrl) {
    await step('PostgreSQL', async (say) => say('the one that DATABASE_URL names'));
  } else {
    const database = await step('PostgreSQL', async (say) =>
      services.add(
        await startPostgres({ dir: path.join(dataDir, 'postgres'), passwords: secrets.database, log: say }),
      ),
    );
    env.DATABASE_URL = database.url;
    env.DATABASE_APP_URL = database.appUrl;
  }
  if (settings.storage) {
    await step('Blob store', async (say) => say('the one that AZURE_STORAGE_CONNECTION_STRING names'));
  } else {
    const options = { dir: path.join(dataDir, 'blobs'), accountKey: secrets.storageKey };
    const blobs = await step('Blob store (Azurite)', async () =>
      services.add(await startAzurite({ ...options, logFile: path.join(logs, 'blobs.log') })),
    );
    env.AZURE_STORAGE_CONNECTION_STRING = blobs.connectionString;
  }
  if (isDemo(settings)) Object.assign(env, { DEMO: '1', DEMO_PASSWORD: secrets.demoPassword });
  return env;
}

/** The demo belongs to stores of our own only; what the environment names is never seeded. */
function isDemo(settings) {
  return !settings.databaseUrl && !settings.storage;
}

async function startServer({ settings, env, logFile }) {
  const server = services.add(
    startChild({
      name: 'The server',
      command: process.execPath,
      args: [...serverFlags, ...endWithParentArgs, '--import', 'tsx', 'server/index.ts'],
      cwd: root,
      env,
      logFile,
    }),
  );
  await waitFor(`${settings.url}/readyz`, { giveUp: server.failure });
  return server;
}

/** Once: the database itself remembers. */
async function seedOnce({ settings, env }) {
  if (!isDemo(settings)) return false;
  await step('Demo', async (say) => {
    const { output } = await run(process.execPath, ['--import', 'tsx', 'scripts/seed/seed.ts'], {
      cwd: root,
      env: { ...env, UPSTAND_URL: settings.url },
    });
    say(output.trim().split('\n').at(-1) ?? '');
  });
  return true;
}

function tellReady({ settings, secrets, seeded, logs, seconds }) {
  console.log(`\nReady after ${formatSeconds(seconds)}:  ${settings.url}\n`);
  if (seeded) {
    const { people } = JSON.parse(readFileSync(path.join(root, 'scripts/seed/story/people.json'), 'utf8'));
    const accounts = people.filter((person) => person.account);
    for (const { email, name, does } of accounts)
      console.log(`  ${email.padEnd(30)} ${name.padEnd(14)} ${does}`);
    console.log(`\n  Password: ${secrets.demoPassword}\n`);
  }
  console.log(
    `Logs: ${logs}\nCtrl-C ends it; npm start goes on with the same data; npm run reset starts over.`,
  );
}
