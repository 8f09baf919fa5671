import { SMTPServer } from 'smtp-server';
import { freePort } from '#scripts/lib/free-port.mjs';
import { makeHold, type Hold } from './hold.ts';

export type Delivery = { readonly to: string; readonly messageId: string; readonly subject: string };

export type MailServer = {
  readonly port: number;
  /** Every message that came whole, also one whose acceptance its sender never heard of. */
  readonly deliveries: readonly Delivery[];
  /** Recipients refused for good (550). */
  readonly refused: Set<string>;
  /** The next message comes in whole and is not answered until it is let go. */
  holdData(): Hold;
  up(): Promise<void>;
  down(): Promise<void>;
};

/** A mail server that behaves as badly as it is told to. */
export async function startMailServer(): Promise<MailServer> {
  const port = await freePort();
  const deliveries: Delivery[] = [];
  const refused = new Set<string>();
  const holds: (() => Promise<void>)[] = [];
  let server: SMTPServer | null = null;
  const make = (): SMTPServer =>
    new SMTPServer({
      disabledCommands: ['AUTH', 'STARTTLS'],
      disableReverseLookup: true,
      onRcptTo({ address }, _session, done) {
        if (!refused.has(address)) return done();
        return done(Object.assign(new Error('No such person here'), { responseCode: 550 }));
      },
      onData(stream, session, done) {
        const chunks: Buffer[] = [];
        stream.on('data', (chunk: Buffer) => chunks.push(chunk));
        stream.on('end', () => {
          const source = Buffer.concat(chunks).toString('utf8');
          for (const { address } of session.envelope.rcptTo)
            deliveries.push({
              to: address,
              messageId: header(source, 'Message-ID'),
              subject: header(source, 'Subject'),
            });
          void (holds.shift()?.() ?? Promise.resolve()).then(() => done());
        });
      },
    });
  const mail: MailServer = {
    port,
    deliveries,
    refused,
    holdData: () => {
      const { hold, stand } = makeHold();
      holds.push(stand);
      return hold;
    },
    up: () =>
      new Promise((resolve) => {
        server = make();
        server.on('error', () => undefined);
        server.listen(port, '127.0.0.1', () => resolve());
      }),
    down: () =>
      new Promise((resolve) => {
        if (!server) return resolve();
        server.close(() => resolve());
        server = null;
        return undefined;
      }),
  };
  await mail.up();
  return mail;
}

const header = (source: string, name: string): string =>
  new RegExp(`^${name}: (.*)$`, 'im').exec(source)?.[1]?.trim() ?? '';
