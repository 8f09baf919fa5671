import { describe, expect, it } from 'vitest';
import { mayPass } from './cluster-account.mjs';
import { newestFirst } from './find-postgres.mjs';
import { isInstalled } from './node-packages.mjs';
import { listeningInode } from './port-owner.mjs';
import { afterName, beganAt, isAlive } from './process-info.mjs';
import { formatSeconds } from './step.mjs';

describe('what the start learns of the machine', () => {
  it('prefers the newest PostgreSQL by number, not by letters', () => {
    expect(newestFirst(['9.6', '15', 'share', '17'])).toEqual(['17', '15', '9.6']);
  });

  it('knows by the bit that counts whether an account may enter a folder', () => {
    const account = { uid: 100, gid: 200 };
    expect(mayPass({ uid: 0, gid: 0, mode: 0o700 }, account)).toBe(false);
    expect(mayPass({ uid: 0, gid: 0, mode: 0o711 }, account)).toBe(true);
    expect(mayPass({ uid: 0, gid: 200, mode: 0o701 }, account)).toBe(false);
    expect(mayPass({ uid: 100, gid: 0, mode: 0o700 }, account)).toBe(true);
  });

  it('finds who listens on a port, and not who only talks through it', () => {
    const table = `  sl  local_address rem_address   st tx_queue rx_queue tr tm->when retrnsmt   uid  timeout inode
   0: 0100007F:11F8 0100007F:9C40 01 00000000:00000000 00:00000000 00000000     0        0 111 1
   1: 0100007F:11F8 00000000:0000 0A 00000000:00000000 00:00000000 00000000     0        0 222 1`;
    expect(listeningInode(table, 4600)).toBe('222');
    expect(listeningInode(table, 4601)).toBeNull();
  });

  it('reads past a process name with blanks and brackets', () => {
    expect(afterName('42 (a (b) c) S 1 2')).toEqual(['S', '1', '2']);
    expect(isAlive(process.pid)).toBe(true);
    expect(beganAt(process.pid)).toMatch(/^\d+$/);
  });

  it('sees when the installed packages are not those of the lock file', () => {
    const wanted = {
      packages: {
        '': {},
        'node_modules/a': { version: '1.0.0' },
        'node_modules/b': { version: '2.0.0', optional: true },
      },
    };
    expect(isInstalled(wanted, null)).toBe(false);
    expect(isInstalled(wanted, { packages: { 'node_modules/a': { version: '1.0.0' } } })).toBe(true);
    expect(isInstalled(wanted, { packages: { 'node_modules/a': { version: '1.0.1' } } })).toBe(false);
    expect(isInstalled(wanted, { packages: { 'node_modules/b': { version: '2.0.0' } } })).toBe(false);
  });

  it('writes times as people read them', () => {
    expect([0.04, 9.94, 12.4, 125].map(formatSeconds)).toEqual(['0.0 s', '9.9 s', '12 s', '2 min 05 s']);
  });
});
