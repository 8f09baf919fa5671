import { existsSync } from 'node:fs';
import path from 'node:path';
import { installPackages } from './debian-packages.mjs';

/** The path of Chromium, installed from Debian's packages when it is missing. Without it the browser tests fail. */
export async function ensureChromium() {
  const found = findChromium();
  if (found) return found;
  await installPackages(
    ['chromium'],
    'Chromium, which the browser tests need, is not installed on this machine.',
  );
  const installed = findChromium();
  if (!installed) throw new Error('Chromium was installed, but it is not on the PATH.');
  return installed;
}

function findChromium() {
  const folders = [...(process.env.PATH ?? '').split(path.delimiter), '/usr/bin'].filter(
    (folder) => folder !== '',
  );
  const places = folders.flatMap((folder) =>
    ['chromium', 'chromium-browser', 'google-chrome'].map((name) => path.join(folder, name)),
  );
  return places.find((place) => existsSync(place)) ?? null;
}
