import { pino, type Logger } from 'pino';

/** Paths that hold secrets wherever a request, a setting or an error is logged. */
const SECRET = [
  'password',
  '*.password',
  'token',
  '*.token',
  'cookie',
  '*.cookie',
  'req.headers.cookie',
  'req.headers.authorization',
  'req.headers["x-csrf-token"]',
  'res.headers["set-cookie"]',
  'headers.cookie',
  'sessionSecret',
  '*.sessionSecret',
];

export function createLog(level: string): Logger {
  return pino({ level, redact: { paths: SECRET, censor: '[kept out of the log]' } });
}
