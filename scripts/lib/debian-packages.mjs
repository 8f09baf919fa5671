import { existsSync } from 'node:fs';
import { StartProblem } from './problem.mjs';
import { attempt, lastLines } from './run.mjs';

/**
 * Installs Debian packages, or says what to type where that is not ours to do.
 * @param {string[]} names
 * @param {string} why what is missing, as a sentence
 */
export async function installPackages(names, why) {
  const line = `apt-get update && apt-get install -y --no-install-recommends ${names.join(' ')}`;
  if (!existsSync('/usr/bin/apt-get')) {
    throw new StartProblem(
      why,
      `Install ${names.join(' and ')} with your system's package manager, then try again.`,
    );
  }
  if (process.getuid?.() !== 0) {
    throw new StartProblem(why, `Install it with:\n  sudo sh -c '${line}'\nthen try again.`);
  }
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' };
  const update = await attempt('apt-get', ['update', '-q'], { env });
  const install = await attempt('apt-get', ['install', '-y', '-q', '--no-install-recommends', ...names], {
    env,
  });
  if (install.code === 0) return;
  const said = lastLines(update.code === 0 ? install.output : `${update.output}\n${install.output}`, 8);
  throw new StartProblem(
    `${why} Installing it did not succeed:\n${said}`,
    `Check the network and the package sources, or install it yourself:\n  ${line}\nthen try again.`,
  );
}
