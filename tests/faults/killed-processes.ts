import { describe, expect, it } from 'vitest';
import type { ParkedJob } from '#shared/generated/api-types.ts';
import { sweep } from '#server/storage/sweep-blobs.ts';
import { countOf, expectWhole } from './setup/expect-whole.ts';
import { createBatch, oneLine, openBatch, putWorkbook, type World } from './setup/story.ts';
import { ALL_DONE, beginAll, makeLastAttempts, readAll } from './setup/under-way.ts';

const DIED = 'The process that worked on it died.';

export function killedProcesses(world: World): void {
  describe('a web process that is killed', () => {
    it('after the file was put and before its row leaves nothing that counts; after the commit the upload stands and a repeat adds none', async () => {
      const { stage, story } = world();
      const [before, after] = [await openBatch(story), await openBatch(story)];
      const [lost, kept] = [await oneLine(story, 'L-2'), await oneLine(story, 'L-3')];
      const { database, blobs } = stage.web();

      const put = blobs.holdReply(/^COPY /);
      const first = outcomeOf(putWorkbook(story, before, lost));
      await put.reached;
      const committed = database.holdCommitted(/insert into inputs/);
      const second = outcomeOf(putWorkbook(story, after, kept));
      await committed.reached;
      const made = database.holdCommitted(/insert into "?batches/);
      const third = outcomeOf(createBatch(story, 'a-key-of-its-own'));
      await made.reached;
      await stage.web().kill();
      expect(await Promise.all([first, second, third])).toEqual(['broke off', 'broke off', 'broke off']);
      await stage.startWeb();
      await stage.rest();

      const untouched = (await story.contractor.get(before.path)).body;
      expect([untouched.status, untouched.input]).toEqual(['draft', 0]);
      const checked = (await story.contractor.get(after.path)).body;
      expect([checked.status, checked.input, checked.counts.lines]).toEqual(['checked', 1, 1]);
      await expectWhole(stage);
      // What was put and never referred to is what the sweeper takes, and no more.
      const swept = await sweep({
        em: stage.em(),
        blobs: stage.blobs,
        before: new Date(Date.now() + 60_000),
      });
      expect([swept.unreferenced, swept.unknown]).toEqual([0, 1]);

      const again = await putWorkbook(story, before, lost);
      expect([again.status, again.body.input]).toEqual([202, 1]);
      const repeated = await putWorkbook(story, after, kept);
      expect([repeated.status, repeated.body.input]).toEqual([202, 1]);
      const batches = await countOf(stage, 'batches');
      const answered = await createBatch(story, 'a-key-of-its-own');
      expect([answered.status, answered.headers['idempotency-replayed']]).toEqual([201, 'true']);
      expect(await countOf(stage, 'batches')).toBe(batches);
      await expectWhole(stage);
      expect(
        await countOf(stage, 'inputs i join revisions v on v.id = i.revision_id where v.batch_id = $1', [
          after.id,
        ]),
      ).toBe(1);
    });
  });

  describe('a worker that is killed', () => {
    it('in the middle of a check, a photograph, a transmittal and a message: another does them, each once', async () => {
      const { stage, story } = world();
      const doomed = stage.worker();
      const data = stage.mail.holdData();
      const { email } = story.site.contractor;
      await story.contractor.post('/api/password-resets').send({ email });
      await data.reached;
      const begun = await beginAll(story, { worker: doomed, structureNumber: 'L-4' });
      await stage.startWorker();
      await doomed.kill();
      await expectWhole(stage);
      expect(await readAll(story, begun)).toEqual(ALL_DONE);
      // The server had the whole message when its sender died: it came again, under its Message-ID.
      const ids = stage.mail.deliveries.filter((one) => one.to === email && /password/i.test(one.subject));
      expect(ids).toHaveLength(2);
      expect(new Set(ids.map((one) => one.messageId)).size).toBe(1);
      data.letGo();
    });

    it('on the last attempt: its work is parked, each page says what to do, and the administrator has it done', async () => {
      const { stage, story } = world();
      const doomed = stage.worker();
      const begun = await beginAll(story, { worker: doomed, structureNumber: 'L-5' });
      await makeLastAttempts(stage);
      await stage.startWorker();
      await doomed.kill();
      await expectWhole(stage);
      const ended = await readAll(story, begun);
      // The check goes on without what could not be prepared.
      expect(ended.small).toEqual([]);
      expect(ended.states).toEqual(['failed', 'draft', 'stored', 'failed']);
      expect(ended.problems).toEqual([
        expect.stringContaining('Press “Check again”'),
        expect.stringContaining('Tell the administrator'),
        expect.stringContaining('An administrator can look at the parked job'),
      ]);

      const parked = (await story.admin.get('/api/jobs/parked')).body.items as ParkedJob[];
      const { body: batch } = await story.contractor.get(begun.pictured.path);
      const { body: transmittal } = await story.clerk.get(`/api/transmittals/${begun.transmittalId}`);
      expect(new Set(parked.map((job) => [job.title, job.about, job.problem]))).toEqual(
        new Set([
          ['Check a batch', begun.checked.number, DIED],
          ['Issue a transmittal', `${transmittal.number} rev 0`, DIED],
          ['Prepare photographs', batch.number, DIED],
        ]),
      );
      for (const job of parked) await story.admin.post(`/api/jobs/parked/${job.id}/retry`).expect(204);
      await expectWhole(stage);
      expect(await readAll(story, begun)).toEqual(ALL_DONE);
      expect((await story.admin.get('/api/jobs/parked')).body.items).toEqual([]);
      for (const [action, times] of [
        ['batch.check-failed', 1],
        ['batch.photos-failed', 1],
        ['transmittal.failed', 1],
        ['job.parked', 3],
        ['job.retried', 3],
      ])
        expect([action, await countOf(stage, 'trail where action = $1', [action])]).toEqual([action, times]);
    });
  });
}

/** What the sender of a request saw. */
const outcomeOf = (request: PromiseLike<unknown>): PromiseLike<string> =>
  request.then(
    () => 'answered',
    () => 'broke off',
  );
