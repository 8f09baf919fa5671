import { readFileSync, readdirSync, readlinkSync } from 'node:fs';

/**
 * Says which process listens on a TCP port, as far as this account may see (Linux).
 * @param {number} port
 * @returns {string | null} like `process 4711 (nginx)`
 */
export function portOwner(port) {
  try {
    const tables = ['/proc/net/tcp', '/proc/net/tcp6'].map(readOrEmpty);
    const inode = tables.map((table) => listeningInode(table, port)).find((found) => found !== null);
    return inode ? processHolding(inode) : null;
  } catch {
    return null; // a courtesy in a message: never a reason to fail
  }
}

/** Finds the socket's inode in the text of /proc/net/tcp: state 0A is LISTEN, ports are hexadecimal. */
export function listeningInode(table, port) {
  const wanted = port.toString(16).toUpperCase().padStart(4, '0');
  for (const line of table.split('\n').slice(1)) {
    const [, local, , state, , , , , , inode] = line.trim().split(/\s+/);
    if (state === '0A' && local?.endsWith(`:${wanted}`)) return inode ?? null;
  }
  return null;
}

function processHolding(inode) {
  for (const pid of readdirSync('/proc').filter((name) => /^\d+$/.test(name))) {
    let descriptors = [];
    try {
      descriptors = readdirSync(`/proc/${pid}/fd`);
    } catch {
      continue;
    }
    for (const fd of descriptors) {
      try {
        if (readlinkSync(`/proc/${pid}/fd/${fd}`) !== `socket:[${inode}]`) continue;
        return `process ${pid} (${readOrEmpty(`/proc/${pid}/comm`).trim() || 'name unknown'})`;
      } catch {
        continue;
      }
    }
  }
  return null;
}

function readOrEmpty(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return '';
  }
}
