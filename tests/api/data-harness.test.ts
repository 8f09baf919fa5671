import { afterAll, beforeAll, expect, it } from 'vitest';
import { ROLES } from '#shared/permissions/ability.ts';
import { verifyTrail } from '#server/trail/verify-trail.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness.close());

it.each(ROLES)('a new %s signs in, is told who they are, and the trail tells of it', async (role) => {
  const actor = await harness.person(role);
  const agent = await harness.signIn(actor);
  const reply = await agent.get('/api/session');
  expect(reply.status).toBe(200);
  expect(reply.body).toMatchObject({ user: { id: actor.id, email: actor.email, role } });
  const { rows } = await harness.services.pool.query('select action from trail where actor_id = $1', [
    actor.id,
  ]);
  expect(rows).toEqual([{ action: 'session.signed-in' }]);
  expect((await verifyTrail(harness.em())).intact).toBe(true);
});

it('the token of the session is on every request of the agent', async () => {
  const agent = await harness.signIn('auditor');
  expect((await agent.delete('/api/session')).status).toBeLessThan(300);
  expect((await agent.get('/api/session')).status).toBe(401);
});
