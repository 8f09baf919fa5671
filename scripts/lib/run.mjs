import { spawn } from 'node:child_process';

/**
 * Runs a command to its end and gives its output. A non-zero exit rejects with the last lines of what it said.
 * @param {string} command
 * @param {string[]} args
 * @param {{cwd?: string, env?: NodeJS.ProcessEnv, uid?: number, gid?: number, input?: string, show?: boolean, timeoutMs?: number}} [options]
 *   `show` passes the output through instead of keeping it.
 * @returns {Promise<{code: number, output: string}>}
 */
export async function run(command, args, options = {}) {
  const result = await attempt(command, args, options);
  if (result.code === 0) return result;
  const said = lastLines(result.output, 15);
  throw new Error(`${command} ${args.join(' ')} ended with ${result.code}.${said ? `\n${said}` : ''}`);
}

/** Like `run`, but a non-zero exit is an answer, not a failure. A command that does not exist answers 127. */
export function attempt(command, args, options = {}) {
  const { input, show = false, timeoutMs, ...rest } = options;
  return new Promise((resolve) => {
    const out = show ? 'inherit' : 'pipe';
    const child = spawn(command, args, {
      ...rest,
      stdio: [input === undefined ? 'ignore' : 'pipe', out, out],
    });
    let output = '';
    const keep = (chunk) => {
      output = (output + chunk.toString('utf8')).slice(-200_000);
    };
    child.stdout?.on('data', keep);
    child.stderr?.on('data', keep);
    const timer = timeoutMs ? setTimeout(() => child.kill('SIGKILL'), timeoutMs) : null;
    child.once('error', (error) => resolve({ code: 127, output: error.message }));
    child.once('close', (code) => {
      if (timer) clearTimeout(timer);
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
