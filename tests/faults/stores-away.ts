import { describe, expect, it } from 'vitest';
import { expectWhole } from './setup/expect-whole.ts';
import { restartPostgres, startBlobs, stopBlobs } from './setup/stores.ts';
import { askTransmittal, oneLine, openBatch, postPhoto, putWorkbook, type World } from './setup/story.ts';
import { ALL_DONE, beginAll, SMALL, readAll } from './setup/under-way.ts';

const TRY_AGAIN = {
  code: 'storage.unreachable',
  detail: 'The store behind this site cannot be reached just now. Nothing is lost; try again in a moment.',
};

export function storesAway(world: World): void {
  describe('in the middle of a check, a photograph, a transmittal and an upload', () => {
    it('PostgreSQL is restarted: the upload is to be repeated, the rest is done by itself, each once', async () => {
      const { stage, story } = world();
      const begun = await beginAll(story, { worker: stage.worker(), structureNumber: 'L-6' });
      const batch = await openBatch(story);
      const bytes = await oneLine(story, 'L-7');
      const row = stage.web().database.holdStatement(/insert into inputs/);
      const upload = putWorkbook(story, batch, bytes).then((reply) => reply);
      await row.reached;
      await restartPostgres();
      for (const hold of [...begun.holds, row]) hold.letGo();

      const refused = await upload;
      expect([refused.status, refused.body]).toEqual([503, expect.objectContaining(TRY_AGAIN)]);
      await expectWhole(stage);
      expect(await readAll(story, begun)).toEqual(ALL_DONE);
      expect((await story.contractor.get(batch.path)).body.input).toBe(0);
      await putWorkbook(story, batch, bytes).expect(202);
      await expectWhole(stage);
    });

    it('the blob store is stopped and comes back: the upload is to be repeated, the rest is done by itself, each once', async () => {
      const { stage, story } = world();
      const { blobs } = stage.worker();
      const [checked, pictured, batch] = [
        await openBatch(story),
        await openBatch(story),
        await openBatch(story),
      ];
      const bytes = await oneLine(story, 'L-8');
      // The workbook is read, the pictures are put, the as-built is put, the new file is put.
      const holds = [
        blobs.holdRequest(/^GET /),
        blobs.holdRequest(/^COPY /),
        blobs.holdRequest(/^PUT \S+incoming/),
      ];
      await putWorkbook(story, checked, await oneLine(story, 'L-9')).expect(202);
      await holds[0]?.reached;
      await postPhoto(story, pictured, 'L-9 finish.jpg', SMALL);
      await putWorkbook(story, pictured, await oneLine(story, 'L-9')).expect(202);
      const asked = await askTransmittal(story);
      const file = stage.web().blobs.holdRequest(/^PUT \S+incoming/);
      const upload = putWorkbook(story, batch, bytes).then((reply) => reply);
      await Promise.all([...holds, file].map((hold) => hold.reached));
      await stopBlobs();
      for (const hold of [...holds, file]) hold.letGo();

      const refused = await upload;
      expect([refused.status, refused.body]).toEqual([503, expect.objectContaining(TRY_AGAIN)]);
      await startBlobs();
      await expectWhole(stage);
      const begun = { checked, pictured, transmittalId: asked.body.id, holds };
      expect(await readAll(story, begun)).toEqual(ALL_DONE);
      expect((await story.contractor.get(batch.path)).body.input).toBe(0);
      await putWorkbook(story, batch, bytes).expect(202);
      await expectWhole(stage);
    });
  });
}
