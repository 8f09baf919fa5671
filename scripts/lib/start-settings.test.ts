import { describe, expect, it } from 'vitest';
import { readStartSettings } from './start-settings.mjs';

describe('readStartSettings', () => {
  it('has a working default for each', () => {
    expect(readStartSettings({}, '/srv/upstand')).toEqual({
      port: 4600,
      url: 'http://127.0.0.1:4600',
      dataDir: '/srv/upstand/var',
      databaseUrl: null,
      storage: null,
      smtpUrl: null,
    });
  });

  it('takes a blank setting for none, and an absolute folder as it is', () => {
    const settings = readStartSettings({ DATABASE_URL: ' ', PORT: '', DATA_DIR: '/data' }, '/srv/upstand');
    expect(settings).toMatchObject({ databaseUrl: null, port: 4600, dataDir: '/data' });
  });

  it.each(['0', '65536', '-1', '80.5', '4600x', 'abc'])('refuses PORT %s and says why', (PORT) => {
    expect(() => readStartSettings({ PORT }, '/')).toThrow(/whole number from 1 to 65535/);
  });
});
