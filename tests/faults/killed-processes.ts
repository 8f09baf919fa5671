import { describe, expect, it } from 'vitest';
import { sweep } from '#server/storage/sweep-blobs.ts';
import { countOf, expectWhole } from './setup/expect-whole.ts';
import type { FaultStage } from './setup/fault-stage.ts';
import { oneLine, openBatch, putWorkbook, type Story } from './setup/story.ts';

type World = () => { readonly stage: FaultStage; readonly story: Story };

export function killedProcesses(world: World): void {
  describe('a web process that is killed', () => {
    it('after the file was put and before its row leaves nothing that counts; after the commit the upload stands and a repeat adds none', async () => {
      const { stage, story } = world();
      const [before, after] = [await openBatch(story), await openBatch(story)];
      const [lost, kept] = [await oneLine(story, 'L-2'), await oneLine(story, 'L-3')];
      const { database, blobs } = stage.web();

      const put = blobs.holdReply(/^COPY /);
      const first = putWorkbook(story, before, lost).then(
        () => 'answered',
        () => 'broke off',
      );
      await put.reached;
      const committed = database.holdCommitted(/insert into inputs/);
      const second = putWorkbook(story, after, kept).then(
        () => 'answered',
        () => 'broke off',
      );
      await committed.reached;
      await stage.web().kill();
      expect(await Promise.all([first, second])).toEqual(['broke off', 'broke off']);
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
      await expectWhole(stage);
      expect(
        await countOf(stage, 'inputs i join revisions v on v.id = i.revision_id where v.batch_id = $1', [
          after.id,
        ]),
      ).toBe(1);
    });
  });
}
