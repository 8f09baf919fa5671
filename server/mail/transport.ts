import nodemailer, { type Transporter } from 'nodemailer';

/** A connection to the mail server with every wait bounded: a slow one holds a job, never the process. */
export function createTransport(smtpUrl: string): Transporter {
  const url = new URL(smtpUrl);
  const secure = url.protocol === 'smtps:';
  return nodemailer.createTransport({
    host: url.hostname,
    port: url.port === '' ? (secure ? 465 : 587) : Number(url.port),
    secure,
    ...(url.username === ''
      ? {}
      : { auth: { user: decodeURIComponent(url.username), pass: decodeURIComponent(url.password) } }),
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 30_000,
    // Nothing in a message is fetched or read from a disk.
    disableFileAccess: true,
    disableUrlAccess: true,
  });
}
