import { createServer } from 'node:http';
import { createApp } from '#server/app.ts';
import { ConfigError, loadConfig } from '#server/config/config.ts';
import { createServices } from '#server/container.ts';
import { startCapture } from '#server/mail/capture-server.ts';
import { closeEventStreams } from '#server/modules/events/send-events.ts';
import { startWorker } from '#server/worker.ts';

/** How long requests under way may take after the process was told to stop. */
const GRACE_MS = 10_000;

async function main(): Promise<void> {
  const config = loadConfig(process.env);
  const services = await createServices(config);
  const { log } = services;
  const capture = config.captureMail && config.run !== 'worker' ? await startCapture(services) : null;
  const worker = config.run === 'web' ? null : await startWorker(services);
  const web = config.run === 'worker' ? null : createApp(services);
  const server = web ? createServer(web.app) : null;
  // An upload of many photographs may take long; a header may not.
  if (server)
    Object.assign(server, { headersTimeout: 30_000, requestTimeout: 30 * 60_000, keepAliveTimeout: 65_000 });

  let stopping = false;
  const stop = async (signal: string): Promise<void> => {
    if (stopping) return;
    stopping = true;
    log.info({ signal }, 'stopping');
    if (web) web.app.locals.stopping = true;
    closeEventStreams(services);
    if (server?.listening) {
      const closed = new Promise((resolve) => void server.close(resolve));
      server.closeIdleConnections();
      const late = setTimeout(() => server.closeAllConnections(), GRACE_MS);
      await closed;
      clearTimeout(late);
    }
    web?.stop();
    await worker?.stop();
    await capture?.close();
    await services.close();
  };
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.on(signal, () => {
      stop(signal).then(
        () => process.exit(0),
        (error: unknown) => {
          log.error({ err: error }, 'did not stop cleanly');
          process.exit(1);
        },
      );
    });
  }

  if (!server) {
    process.stdout.write('Upstand works on jobs.\n');
    return;
  }
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject).listen(config.port, config.bindAddress, resolve);
  });
  process.stdout.write(`Upstand listens on ${config.publicUrl}\n`);
}

main().catch((error: unknown) => {
  const { code } = error as NodeJS.ErrnoException;
  if (error instanceof ConfigError) console.error(error.message);
  else if (code === 'EADDRINUSE')
    console.error('The port is taken. End what listens on it, or set PORT to another.');
  else console.error('The server could not start:', error);
  process.exit(1);
});
