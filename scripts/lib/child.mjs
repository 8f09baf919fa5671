import { spawn } from 'node:child_process';
import { createWriteStream } from 'node:fs';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { lastLines } from './run.mjs';

const endWithParent = pathToFileURL(fileURLToPath(new URL('./end-with-parent.mjs', import.meta.url))).href;

/** Arguments that make a Node child end with us. */
export const endWithParentArgs = ['--import', endWithParent];

/**
 * Starts a long-running child in a process group of its own (Ctrl-C reaches us first, and we end things in order).
 * Its output goes to `logFile`; with `onLine`, each line of it is also handed on.
 * @param {{name: string, command: string, args: string[], logFile?: string, onOutput?: (text: string) => void,
 *   env?: NodeJS.ProcessEnv, cwd?: string, uid?: number, gid?: number, stopSignal?: NodeJS.Signals}} options
 */
export function startChild({ name, command, args, logFile, onOutput, stopSignal = 'SIGTERM', ...options }) {
  const child = spawn(command, args, { ...options, detached: true, stdio: ['pipe', 'pipe', 'pipe'] });
  const log = logFile ? createWriteStream(logFile, { flags: 'a', mode: 0o600 }) : null;
  log?.on('error', () => {}); // a full disk must not take the service down with it
  let said = '';
  const keep = (chunk) => {
    const text = chunk.toString('utf8');
    said = (said + text).slice(-20_000);
    log?.write(text);
    onOutput?.(text);
  };
  child.stdout.on('data', keep);
  child.stderr.on('data', keep);
  child.stdin.on('error', () => {});
  let stopping = false;
  let failure = null;
  const ended = new Promise((resolve) => {
    child.once('error', (error) => {
      failure = new Error(`${name} could not be started: ${error.message}`);
      resolve();
    });
    child.once('close', (code, signal) => {
      const how = signal ? `was ended by ${signal}` : `ended with ${code}`;
      if (!stopping) failure = new Error(`${name} ${how}.${said ? `\n${lastLines(said, 20)}` : ''}`);
      log?.end();
      child.stdin.destroy();
      resolve();
    });
  });
  return {
    name,
    pid: child.pid,
    /** Resolves when the child is gone. */
    ended,
    /** Why it went although nobody stopped it; null while it runs or after `stop`. */
    failure: () => failure,
    output: () => said,
    async stop(timeoutMs = 15_000) {
      stopping = true;
      if (child.exitCode !== null || child.signalCode !== null || failure) return;
      child.kill(stopSignal);
      const timer = setTimeout(() => child.kill('SIGKILL'), timeoutMs);
      await ended;
      clearTimeout(timer);
    },
  };
}
