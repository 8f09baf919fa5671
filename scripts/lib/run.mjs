import { spawn } from 'node:child_process';

/**
 * Runs a command to its end and gives its output. A non-zero exit rejects with the last lines of what it said.
 * @param {string} command
 * @param {string[]} args
 * @param {{cwd?: string, env?: NodeJS.ProcessEnv, uid?: number, gid?: number, input?: string, show?: boolean, timeoutMs?: number, group?: boolean}} [options]
 *   `show` passes the output through instead of keeping it; `group` gives it a process group, to be ended as one.
 * @returns {Promise<{code: number, output: string}>}
 */
export async function run(command, args, options = {}) {
  const result = await attempt(command, args, options);
  if (result.code === 0) return result;
  const said = lastLines(result.output, 15);
  throw new Error(`${command} ${args.join(' ')} ended with ${result.code}.${said ? `\n${said}` : ''}`);
}

const running = new Set();

/** Ends every command that still runs, with what it started itself where it has a group of its own. */
export function endRunning(signal = 'SIGTERM') {
  for (const child of running) kill(child, signal);
}

function kill(child, signal) {
  try {
    process.kill(child.grouped ? -child.pid : child.pid, signal);
  } catch {
    // already gone
  }
}

/** Like `run`, but a non-zero exit is an answer, not a failure. A command that does not exist answers 127. */
export function attempt(command, args, options = {}) {
  const { input, show = false, timeoutMs, group = false, ...rest } = options;
  return new Promise((resolve) => {
    const out = show ? 'inherit' : 'pipe';
    const child = spawn(command, args, {
      ...rest,
      stdio: [input === undefined ? 'ignore' : 'pipe', out, out],
    });
    child.grouped = group;
    running.add(child);
    let output = '';
    const keep = (chunk) => {
      output = (output + chunk.toString('utf8')).slice(-200_000);
    };
    child.stdout?.on('data', keep);
    child.stderr?.on('data', keep);
    const timer = timeoutMs ? setTimeout(() => kill(child, 'SIGKILL'), timeoutMs) : null;
    child.once('error', (error) => {
      running.delete(child);
      resolve({ code: 127, output: error.message });
    });
    child.once('close', (code) => {
      if (timer) clearTimeout(timer);
      running.delete(child);
      resolve({ code: code ?? 1, output });
    });
    if (input !== undefined) {
      child.stdin.on('error', () => {}); // it may have ended before it read all
      child.stdin.end(input);
    }
  });
}

/** The last `count` lines of a text that are not blank. */
export function lastLines(text, count) {
  return text
    .split('\n')
    .filter((line) => line.trim() !== '')
    .slice(-count)
    .join('\n');
}
