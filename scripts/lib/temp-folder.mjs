import { chmodSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

/** A new temporary folder that other accounts may pass through (not read), so that a cluster in it can be reached. */
export function tempFolder(prefix) {
  const folder = mkdtempSync(path.join(tmpdir(), prefix));
  chmodSync(folder, 0o711);
  return folder;
}
