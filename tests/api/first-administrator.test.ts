import { afterAll, beforeAll, expect, it } from 'vitest';
import { firstAdministrator } from '#server/modules/people/first-administrator.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';
import supertest from 'supertest';

let harness: Harness;
beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness.close());

const PERSON = {
  owner: 'Larkmoor Electric Cooperative',
  name: 'S. Pereira',
  email: 'admin@larkmoor.example',
};

it('makes the owner and its first administrator on an empty installation, once', async () => {
  const { token } = await firstAdministrator(harness.em(), PERSON);
  const set = await supertest(harness.app)
    .put(`/api/password-resets/${token}`)
    .send({ password: 'lantern over the moor' });
  expect(set.status).toBeLessThan(300);
  const signedIn = await supertest(harness.app)
    .post('/api/session')
    .send({ email: PERSON.email, password: 'lantern over the moor' });
  expect(signedIn.body.user).toMatchObject({
    role: 'administrator',
    organisation: { name: 'Larkmoor Electric Cooperative' },
  });
  await expect(
    firstAdministrator(harness.em(), { ...PERSON, email: 'other@larkmoor.example' }),
  ).rejects.toMatchObject({
    code: 'administrator.exists',
  });
});
