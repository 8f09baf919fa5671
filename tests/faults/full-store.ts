import { describe, expect, it } from 'vitest';
import { run } from '#server/db/rows.ts';
import type { ParkedJob } from '#shared/generated/api-types.ts';
import { countOf, expectWhole } from './setup/expect-whole.ts';
import type { FaultStage } from './setup/fault-stage.ts';
import { askTransmittal, oneLine, openBatch, postPhoto, putWorkbook, type World } from './setup/story.ts';

const PUT = /^PUT \S+incoming/;

export function fullStore(world: World): void {
  describe('a store that takes no more files', () => {
    it.each([507, 403, 500])('and answers %i: an upload says so and leaves nothing', async (status) => {
      const { stage, story } = world();
      const batch = await openBatch(story);
      const files = await namesIn(stage);
      const lift = stage.web().blobs.answer(PUT, status);
      const trail = await countOf(stage, 'trail');
      const reply = await putWorkbook(story, batch, await oneLine(story, 'L-10'));
      lift();
      expect([reply.status, reply.body.code, reply.headers['retry-after']]).toEqual([
        503,
        'storage.refused',
        '60',
      ]);
      expect(reply.body.detail).toContain('it may be full. Nothing was changed. Upload it again');
      expect((await story.contractor.get(batch.path)).body.input).toBe(0);
      expect(await countOf(stage, 'trail')).toBe(trail);
      expect(await namesIn(stage)).toEqual(files);
      await expectWhole(stage);
    });

    it('stops what a worker puts: tried again, then parked with the reason, and done when there is room', async () => {
      const { stage, story } = world();
      const pictured = await openBatch(story);
      const { blobs } = stage.worker();
      const lift = blobs.answer(PUT, 507);
      await postPhoto(story, pictured, 'L-11 finish.jpg');
      const asked = await askTransmittal(story);
      // Five attempts with growing pauses take a minute; two show the same.
      await run(
        stage.em(),
        `update pgboss.job set retry_limit = 1 where name in ('prepare-photos', 'issue-transmittal') and state <= 'active'`,
      );
      await expectWhole(stage);
      const parked = (await story.admin.get('/api/jobs/parked')).body.items as ParkedJob[];
      const problem = 'The store of files did not take a file: it answered 507.';
      expect(new Set(parked.map(({ name, attempts, problem: said }) => [name, attempts, said]))).toEqual(
        new Set([
          ['issue-transmittal', 2, problem],
          ['prepare-photos', 2, problem],
        ]),
      );
      const failed = (await story.clerk.get(`/api/transmittals/${asked.body.id}`)).body;
      expect([failed.state, failed.sha256]).toEqual(['failed', null]);

      lift();
      for (const job of parked) await story.admin.post(`/api/jobs/parked/${job.id}/retry`).expect(204);
      await expectWhole(stage);
      expect((await story.clerk.get(`/api/transmittals/${asked.body.id}`)).body.state).toBe('issued');
      expect((await story.contractor.get(`${pictured.path}/photos`)).body.items[0].state).toBe('ready');
    });
  });
}

async function namesIn({ blobs }: FaultStage): Promise<string[]> {
  const names: string[] = [];
  for await (const { name } of blobs.list()) names.push(name);
  return names;
}
