import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { queueMail } from '#server/mail/queue-mail.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let sending: Harness;

beforeAll(async () => {
  harness = await createHarness();
  sending = await createHarness({ settings: { CAPTURE_MAIL: '0' } });
});
afterAll(async () => {
  await harness.close();
  await sending.close();
});

async function mail(event: string): Promise<void> {
  await harness.em().transactional((tx) =>
    queueMail(tx, {
      event,
      recipient: { name: 'Ana Núñez', address: 'ana@brindle.example' },
      template: 'password-reset',
      data: {
        name: 'Ana Núñez',
        owner: 'Larkmoor',
        link: 'http://127.0.0.1:4600/password-reset/x',
        validFor: 'one hour',
      },
    }),
  );
  await harness.drain();
}

describe('captured mail', () => {
  it('is listed newest first, page by page, and read as text and HTML', async () => {
    await mail('first');
    await mail('second');
    const admin = await harness.signIn('administrator');
    const first = await admin.get('/api/mail?limit=1');
    expect(first.status).toBe(200);
    expect(first.body.items).toHaveLength(1);
    expect(first.body.items[0]).toMatchObject({
      recipients: ['ana@brindle.example'],
      subject: expect.stringContaining('password') as string,
    });
    const rest = await admin.get(`/api/mail?limit=1&cursor=${first.body.nextCursor}`);
    expect(rest.body.items).toHaveLength(1);
    expect(rest.body.nextCursor).toBeNull();
    expect(rest.body.items[0].id).not.toBe(first.body.items[0].id);

    const message = await admin.get(`/api/mail/${first.body.items[0].id}`);
    expect(message.body.text).toContain('http://127.0.0.1:4600/password-reset/x');
    expect(message.body.html).toContain('Ana Núñez');
  });

  it('is open to administrators alone', async () => {
    for (const role of ['contractor', 'inspector', 'auditor'] as const)
      expect((await (await harness.signIn(role)).get('/api/mail')).status).toBe(403);
  });

  it('answers 404 for a message that is not there, 400 for a cursor of another list', async () => {
    const admin = await harness.signIn('administrator');
    expect((await admin.get('/api/mail/00000000-0000-4000-8000-000000000000')).status).toBe(404);
    expect((await admin.get('/api/mail?cursor=WyJ4Il0')).body.errors[0].pointer).toBe('#/query/cursor');
  });

  it('is not there where messages are really sent', async () => {
    const admin = await sending.signIn('administrator');
    expect((await admin.get('/api/mail')).status).toBe(404);
    expect((await admin.get('/api/mail/00000000-0000-4000-8000-000000000000')).status).toBe(404);
  });
});
