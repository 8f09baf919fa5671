import { describe, expect, it } from 'vitest';
import { row, run } from '#server/db/rows.ts';
import type { ParkedJob } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { countOf, expectWhole } from './setup/expect-whole.ts';
import type { FaultStage } from './setup/fault-stage.ts';
import type { Story, World } from './setup/story.ts';

/** Has a message sent to this person. */
const writeTo = ({ contractor }: Story, { email }: Actor) =>
  contractor.post('/api/password-resets').send({ email });

const cameTo = (stage: FaultStage, { email }: Actor): number =>
  stage.mail.deliveries.filter((one) => one.to === email).length;

async function until(ask: () => Promise<boolean>): Promise<void> {
  while (!(await ask())) await new Promise((resolve) => setTimeout(resolve, 100));
}

export function mailServer(world: World): void {
  describe('a mail server', () => {
    it('that is down delays messages, says why in the outbox, and loses none', async () => {
      const { stage, story } = world();
      const [one, two] = [await stage.person('clerk'), await stage.person('clerk')];
      await stage.mail.down();
      await writeTo(story, one);
      await writeTo(story, two);
      await until(
        async () =>
          (await countOf(stage, `outbox where state = 'queued' and last_error like '%ECONNREFUSED%'`)) === 2,
      );
      await stage.mail.up();
      // The repeat is due in 4 to 8 s; it need not be waited for.
      await run(stage.em(), `update pgboss.job set start_after = now() where name = 'send-mail'`);
      await expectWhole(stage);
      expect([cameTo(stage, one), cameTo(stage, two)]).toEqual([1, 1]);
    });

    it('that is slow over one message holds up no other', async () => {
      const { stage, story } = world();
      const [slow, quick] = [await stage.person('clerk'), await stage.person('clerk')];
      const data = stage.mail.holdData();
      await writeTo(story, slow);
      await data.reached;
      await writeTo(story, quick);
      await until(async () => cameTo(stage, quick) === 1);
      data.letGo();
      await expectWhole(stage);
      expect([cameTo(stage, slow), cameTo(stage, quick)]).toEqual([1, 1]);
    });

    it('that refuses one address: the others go, the refused one is parked at once and goes when it is taken again', async () => {
      const { stage, story } = world();
      const [refused, taken] = [await stage.person('clerk'), await stage.person('clerk')];
      stage.mail.refused.add(refused.email);
      await writeTo(story, refused);
      await writeTo(story, taken);
      await expectWhole(stage);
      expect([cameTo(stage, refused), cameTo(stage, taken)]).toEqual([0, 1]);
      const [job, ...others] = (await story.admin.get('/api/jobs/parked')).body.items as ParkedJob[];
      expect(others).toEqual([]);
      expect(job).toMatchObject({
        title: 'Send a message',
        about: `password-reset to ${refused.email}`,
        attempts: 1,
      });
      expect(job?.problem).toContain('550 No such person here');
      const kept = await row(stage.em(), 'select state, attempts from outbox where recipient = $1', [
        refused.email,
      ]);
      expect(kept).toEqual({ state: 'failed', attempts: 1 });

      stage.mail.refused.clear();
      await story.admin.post(`/api/jobs/parked/${job?.id}/retry`).expect(204);
      await expectWhole(stage);
      expect(cameTo(stage, refused)).toBe(1);
    });
  });
}
