import { readFile } from 'node:fs/promises';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PASSWORD } from '#tests/factories/people.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

let loopback: Harness;
let secure: Harness;
beforeAll(async () => {
  loopback = await createHarness();
  secure = await createHarness({
    settings: { PUBLIC_URL: 'https://upstand.example', TRUSTED_PROXIES: '1' },
  });
});
afterAll(async () => {
  await loopback?.close();
  await secure?.close();
});

const policyOf = (header: unknown): Map<string, string[]> =>
  new Map(
    String(header)
      .split(';')
      .map((part) => part.trim().split(/\s+/))
      .map(([name = '', ...sources]) => [name, sources] as const),
  );

describe('every answer', () => {
  it.each(['/', '/api/app', '/api/session', '/api/nothing', '/healthz'])(
    'of %s says what browsers may do',
    async (path) => {
      const { headers } = await supertest(loopback.app).get(path);
      const policy = policyOf(headers['content-security-policy']);
      expect(policy.get('default-src')).toEqual(["'self'"]);
      expect(policy.get('script-src')).toEqual(["'self'"]);
      expect(policy.get('script-src-attr')).toEqual(["'none'"]);
      expect(policy.get('object-src')).toEqual(["'none'"]);
      expect(policy.get('base-uri')).toEqual(["'none'"]);
      expect(policy.get('form-action')).toEqual(["'self'"]);
      expect(policy.get('frame-ancestors')).toEqual(["'none'"]);
      expect(headers['x-frame-options']).toBe('DENY');
      expect(headers['x-content-type-options']).toBe('nosniff');
      expect(headers['referrer-policy']).toBe('same-origin');
      expect(headers['cross-origin-opener-policy']).toBe('same-origin');
      expect(headers['cross-origin-resource-policy']).toBe('same-origin');
      for (const feature of ['camera', 'microphone', 'geolocation', 'payment', 'usb'])
        expect(String(headers['permissions-policy'])).toContain(`${feature}=()`);
    },
  );
});

it('the page has no script in itself, so that none has to be allowed', async () => {
  const page = await readFile(new URL('../../index.html', import.meta.url), 'utf8');
  const scripts = page.match(/<script\b[^>]*>/g) ?? [];
  expect(scripts.length).toBeGreaterThanOrEqual(1);
  for (const script of scripts) expect(script).toMatch(/\ssrc="\//);
  expect(page).not.toMatch(/\son[a-z]+=/i);
});

describe('transport', () => {
  it('is bound to TLS for a year where the address is https, its cookie to this host and to TLS', async () => {
    const person = await secure.person('clerk');
    const reply = await supertest(secure.app)
      .post('/api/session')
      .set('Host', 'upstand.example')
      .set('X-Forwarded-Proto', 'https')
      .send({ email: person.email, password: PASSWORD });
    expect(reply.headers['strict-transport-security']).toBe('max-age=31536000');
    expect(String(reply.headers['set-cookie']?.[0])).toMatch(/^__Host-upstand=.*;\s*Secure/);
    expect(policyOf(reply.headers['content-security-policy']).has('upgrade-insecure-requests')).toBe(true);
  });

  it('is not over plain HTTP on loopback, where it would bind the ports of other programs', async () => {
    const { headers } = await supertest(loopback.app).get('/api/app');
    expect(headers['strict-transport-security']).toBeUndefined();
    expect(policyOf(headers['content-security-policy']).has('upgrade-insecure-requests')).toBe(false);
  });
});

it('the cookie of a session is closed to scripts and to other sites', async () => {
  const person = await loopback.person('clerk');
  const reply = await supertest(loopback.app)
    .post('/api/session')
    .send({ email: person.email, password: PASSWORD });
  const cookie = String(reply.headers['set-cookie']?.[0]);
  expect(cookie).toMatch(/;\s*HttpOnly/);
  expect(cookie).toMatch(/;\s*SameSite=Lax/);
  expect(cookie).toMatch(/;\s*Path=\//);
});
