import { SMTPServer } from 'smtp-server';
import type { Services } from '#server/container.ts';
import { storeCaptured } from '#server/mail/captured-mail.ts';

const MOST_BYTES = 2 * 1024 * 1024;

export type Capture = { readonly port: number; close(): Promise<void> };

/**
 * A mail server on loopback that delivers to nobody: it keeps messages in the database, where an administrator reads them.
 * Null: the port is taken, by the capture of another process of this installation as a rule.
 */
export async function startCapture(services: Services): Promise<Capture | null> {
  const url = new URL(services.config.smtpUrl);
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: MOST_BYTES,
    banner: 'Upstand keeps mail here and delivers none',
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      let size = 0;
      stream.on('data', (chunk: Buffer) => {
        size += chunk.length;
        if (size <= MOST_BYTES) chunks.push(chunk);
      });
      stream.on('error', done);
      stream.on('end', () => {
        if (size > MOST_BYTES) return done(Object.assign(new Error('Too large.'), { responseCode: 552 }));
        const { mailFrom, rcptTo } = session.envelope;
        storeCaptured(services.orm.em.fork(), {
          source: Buffer.concat(chunks).toString('utf8'),
          sender: mailFrom === false ? '' : mailFrom.address,
          recipients: rcptTo.map((to) => to.address),
        }).then(
          () => done(),
          // 4xx: the sender keeps it and comes again.
          () => done(Object.assign(new Error('It could not be kept just now.'), { responseCode: 451 })),
        );
      });
    },
  });
  server.on('error', (error) => services.log.warn({ err: error }, 'the mail capture met a fault'));
  try {
    const port = await listen(server, { host: url.hostname, port: Number(url.port || 25) });
    return { port, close: () => new Promise((resolve) => server.close(() => resolve())) };
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EADDRINUSE') throw error;
    services.log.warn(
      { port: url.port },
      'the port of the mail capture is taken; mail goes to what listens there',
    );
    return null;
  }
}

function listen(server: SMTPServer, at: { host: string; port: number }): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    const net = server.listen(at.port, at.host, () => {
      server.off('error', reject);
      const address = net.address();
      resolve(typeof address === 'object' && address !== null ? address.port : at.port);
    });
  });
}
