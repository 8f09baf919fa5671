import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createOrganisation, createPerson, PASSWORD } from '#tests/factories/people.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

const NEW_PASSWORD = 'gravel lantern otter 17';

let harness: Harness;
let admin: Agent;
beforeAll(async () => {
  harness = await createHarness();
  admin = await harness.signIn('administrator');
});
afterAll(() => harness?.close());

const ask = () => supertest(harness.app);
const signIn = (email: string, password: string) => ask().post('/api/session').send({ email, password });

async function query<T>(sql: string, values: unknown[] = []): Promise<T[]> {
  return (await harness.services.pool.query(sql, values)).rows as T[];
}

/** The token of the newest link that waits in the outbox for this address. */
async function tokenFor(email: string): Promise<string> {
  const [mail] = await query<{ link: string }>(
    `select data ->> 'link' as link from outbox where recipient = $1 order by created_at desc limit 1`,
    [email],
  );
  return /\/password-reset\/([\w-]+)$/.exec(mail?.link ?? '')?.[1] ?? 'none';
}

async function invite(email: string): Promise<string> {
  const { id: organisationId } = await harness.owner();
  const reply = await admin
    .post('/api/people')
    .send({ email, name: 'Ada Rowe', role: 'clerk', organisationId });
  expect(reply.status).toBe(201);
  return String(reply.body.id);
}

describe('an invitation', () => {
  it('makes an account that its link opens, once', async () => {
    const id = await invite('Ada.Rowe@people.example');
    const shown = await admin.get(`/api/people/${id}`);
    expect(shown.body).toMatchObject({
      email: 'ada.rowe@people.example',
      role: 'clerk',
      active: true,
      invited: true,
      can: ['update', 'invite'],
    });
    const token = await tokenFor('ada.rowe@people.example');
    expect((await ask().get(`/api/password-resets/${token}`)).body).toEqual({
      email: 'ada.rowe@people.example',
      purpose: 'invitation',
    });
    const put = (password: string) => ask().put(`/api/password-resets/${token}`).send({ password });
    const weak = await put('short');
    expect([weak.status, weak.body.code, weak.body.errors[0].pointer]).toEqual([
      422,
      'password.weak',
      '/password',
    ]);
    expect((await put(NEW_PASSWORD)).status).toBe(204);
    expect((await signIn('ada.rowe@people.example', NEW_PASSWORD)).status).toBe(200);
    const again = await put('another gravel otter 18');
    expect([again.status, again.body.code]).toEqual([410, 'token.unusable']);
    const told = await query<{ action: string }>(
      'select action from trail where subject_id = $1 order by seq',
      [id],
    );
    expect(told.map(({ action }) => action)).toEqual([
      'person.invited',
      'person.password-set',
      'session.signed-in',
    ]);
  });

  it('reaches the person as a message', async () => {
    await invite('mail@people.example');
    await harness.drain();
    const mails = await query(
      `select subject from captured_mail where 'mail@people.example' = any(recipients)`,
    );
    expect(mails).toHaveLength(1);
  });

  it('keeps only the hash of its token', async () => {
    await invite('hash@people.example');
    const token = await tokenFor('hash@people.example');
    expect(await query('select 1 from tokens where hash = $1', [token])).toEqual([]);
  });

  it('can be sent again, which ends the link before', async () => {
    const id = await invite('twice@people.example');
    const first = await tokenFor('twice@people.example');
    expect((await admin.post(`/api/people/${id}/invitation`)).status).toBe(204);
    expect((await ask().get(`/api/password-resets/${first}`)).status).toBe(410);
    const second = await tokenFor('twice@people.example');
    expect((await ask().put(`/api/password-resets/${second}`).send({ password: NEW_PASSWORD })).status).toBe(
      204,
    );
    expect((await admin.post(`/api/people/${id}/invitation`)).body.code).toBe('person.not-invited');
  });

  it('runs out', async () => {
    const id = await invite('late@people.example');
    const token = await tokenFor('late@people.example');
    await query(`update tokens set expires_at = now() - interval '1 second' where user_id = $1`, [id]);
    expect((await ask().put(`/api/password-resets/${token}`).send({ password: NEW_PASSWORD })).status).toBe(
      410,
    );
  });

  it('is refused for a known address, a role that does not fit, and an unknown organisation', async () => {
    const { id: ownerId } = await harness.owner();
    const contractor = await createOrganisation(harness.em(), { kind: 'contractor' });
    const known = await harness.person('clerk');
    const post = (input: object) =>
      admin.post('/api/people').send({ email: 'x@people.example', name: 'X', ...input });
    const answers = [
      await post({ email: known.email.toUpperCase(), role: 'clerk', organisationId: ownerId }),
      await post({ role: 'contractor', organisationId: ownerId }),
      await post({ role: 'inspector', organisationId: contractor.id }),
      await post({ role: 'clerk', organisationId: known.id }),
    ];
    expect(answers.map(({ status, body }) => [status, body.code, body.errors[0].pointer])).toEqual([
      [409, 'person.email-taken', '/email'],
      [422, 'person.role', '/role'],
      [422, 'person.role', '/role'],
      [422, 'person.organisation', '/organisationId'],
    ]);
  });
});

describe('a forgotten password', () => {
  it('is answered the same for an unknown address, a closed account and a known one', async () => {
    const { id: orgId } = await harness.owner();
    const known = await harness.person('clerk');
    const closed = await createPerson(harness.em(), { role: 'clerk', orgId, active: false });
    const post = (email: string) => ask().post('/api/password-resets').send({ email });
    const answers = [await post(known.email), await post(closed.email), await post('nobody@people.example')];
    expect(answers.map(({ status, text }) => [status, text])).toEqual([
      [202, ''],
      [202, ''],
      [202, ''],
    ]);
    expect(
      await query(`select recipient from outbox where recipient = any($1)`, [
        [known.email, closed.email, 'nobody@people.example'],
      ]),
    ).toEqual([{ recipient: known.email }]);
  });

  it('ends every session and lifts the throttle when a new one is chosen', async () => {
    const person = await harness.person('clerk');
    const agent = await harness.signIn(person);
    await query(
      `insert into throttles (key, window_start, n) values ($1, date_bin('15 minutes', now(), 'epoch'), 9)`,
      [`account:${person.email}`],
    );
    await ask().post('/api/password-resets').send({ email: person.email });
    const token = await tokenFor(person.email);
    expect((await ask().put(`/api/password-resets/${token}`).send({ password: NEW_PASSWORD })).status).toBe(
      204,
    );
    expect((await agent.get('/api/session')).status).toBe(401);
    expect((await signIn(person.email, PASSWORD)).status).toBe(401);
    expect((await signIn(person.email, NEW_PASSWORD)).status).toBe(200);
  });

  it('sends three links in a window and then no more, in silence', async () => {
    const person = await harness.person('clerk');
    for (let n = 0; n < 5; n += 1) {
      expect((await ask().post('/api/password-resets').send({ email: person.email })).status).toBe(202);
    }
    expect(await query('select count(*) as n from outbox where recipient = $1', [person.email])).toEqual([
      { n: 3 },
    ]);
  });

  it('takes no token that was never given out', async () => {
    const reply = await ask()
      .put(`/api/password-resets/${'x'.repeat(43)}`)
      .send({ password: NEW_PASSWORD });
    expect(reply.status).toBe(410);
    expect((await ask().get('/api/password-resets/short')).status).toBe(404);
  });
});

describe('the list of people', () => {
  it('pages by name, each once, with the total of the filter', async () => {
    const organisation = await createOrganisation(harness.em(), { kind: 'contractor' });
    for (const name of ['delta', 'Alpha', 'charlie', 'Bravo', 'alpha']) {
      const { id } = await createPerson(harness.em(), { role: 'contractor', orgId: organisation.id });
      await query('update users set name = $2 where id = $1', [id, name]);
    }
    const names: string[] = [];
    let cursor: string | null = null;
    do {
      const reply = await admin
        .get('/api/people')
        .query({ organisation: organisation.id, limit: 2, ...(cursor && { cursor }) });
      expect(reply.body.total).toBe(5);
      names.push(...(reply.body.items as { name: string }[]).map(({ name }) => name.toLowerCase()));
      cursor = reply.body.nextCursor as string | null;
    } while (cursor);
    expect(names).toEqual(['alpha', 'alpha', 'bravo', 'charlie', 'delta']);
  });

  it('finds part of a name or address as written, without wildcards', async () => {
    const person = await harness.person('auditor');
    await query(`update users set name = '100% Proof_Read' where id = $1`, [person.id]);
    const found = async (q: string) =>
      ((await admin.get('/api/people').query({ q })).body.items as { id: string }[]).map(({ id }) => id);
    expect(await found('100% proof_')).toEqual([person.id]);
    expect(await found('1_0%')).toEqual([]);
  });

  it.each([
    ['administrator', 200],
    ['auditor', 200],
    ['inspector', 403],
    ['engineer', 403],
    ['clerk', 403],
    ['contractor', 403],
  ] as const)('is read by %s with %i', async (role, status) => {
    const agent = await harness.signIn(role);
    expect((await agent.get('/api/people')).status).toBe(status);
  });
});

describe('a change', () => {
  it('of the role takes effect at once and signs the person out', async () => {
    const person = await harness.person('clerk');
    const agent = await harness.signIn(person);
    const reply = await admin
      .patch(`/api/people/${person.id}`)
      .set('If-Match', '"1"')
      .send({ role: 'inspector' });
    expect([reply.status, reply.body.role, reply.body.version]).toEqual([200, 'inspector', 2]);
    expect((await agent.get('/api/session')).status).toBe(401);
    const [told] = await query<{ payload_text: string }>(
      `select payload_text from trail where subject_id = $1 and action = 'person.changed'`,
      [person.id],
    );
    expect(JSON.parse(told?.payload_text ?? '')).toEqual({
      before: { name: person.name, role: 'clerk', active: true },
      after: { name: person.name, role: 'inspector', active: true },
    });
  });

  it('that closes an account makes its links worthless', async () => {
    const id = await invite('closed@people.example');
    const token = await tokenFor('closed@people.example');
    await admin.patch(`/api/people/${id}`).set('If-Match', '"1"').send({ active: false });
    expect((await ask().get(`/api/password-resets/${token}`)).status).toBe(410);
  });

  it('of one’s own role or account is refused; of one’s own name it is not', async () => {
    const person = await harness.person('administrator');
    const agent = await harness.signIn(person);
    const patch = (input: object) =>
      agent.patch(`/api/people/${person.id}`).set('If-Match', '"1"').send(input);
    expect((await patch({ active: false })).body.code).toBe('person.self');
    expect((await patch({ role: 'auditor' })).body.code).toBe('person.self');
    expect((await patch({ name: 'Another Name' })).status).toBe(200);
  });

  it('cannot make an inspector of a contractor’s person', async () => {
    const person = await harness.person('contractor');
    const reply = await admin
      .patch(`/api/people/${person.id}`)
      .set('If-Match', '"1"')
      .send({ role: 'inspector' });
    expect([reply.status, reply.body.code]).toEqual([422, 'person.role']);
  });
});

describe('organisations', () => {
  it('are listed for the owner’s people and hidden from contractors', async () => {
    const { id, name } = await harness.owner();
    const reply = await (await harness.signIn('inspector')).get('/api/organisations?limit=200');
    expect(reply.body.items).toContainEqual(expect.objectContaining({ id, name, kind: 'owner' }));
    expect((await (await harness.signIn('contractor')).get('/api/organisations')).status).toBe(403);
  });

  it('have names of their own', async () => {
    expect((await admin.post('/api/organisations').send({ name: 'Taken Line Works' })).status).toBe(201);
    const again = await admin.post('/api/organisations').send({ name: ' Taken Line Works ' });
    expect([again.status, again.body.code]).toEqual([409, 'organisation.name-taken']);
  });
});
