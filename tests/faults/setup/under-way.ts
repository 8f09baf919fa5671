import { run } from '#server/db/rows.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';
import type { HandedIn } from '#tests/factories/start-batch.ts';
import type { FaultStage } from './fault-stage.ts';
import type { Hold } from './hold.ts';
import type { Part } from './part.ts';
import { askTransmittal, oneLine, openBatch, postPhoto, putWorkbook, type Story } from './story.ts';

/** A check, a photograph and a transmittal that a worker is in the middle of. */
export type UnderWay = {
  readonly checked: HandedIn;
  readonly pictured: HandedIn;
  readonly transmittalId: string;
  readonly holds: readonly Hold[];
};

/**
 * Begins all three and waits until the only worker is held in each: the check with its transaction open and half its
 * rows written, the photograph with its pictures put, the transmittal with its file put and nothing issued.
 */
export async function beginAll(
  story: Story,
  { worker, structureNumber }: { worker: Part; structureNumber: string },
): Promise<UnderWay> {
  const holds = [
    worker.database.holdStatement(/insert into "pours"/),
    worker.database.holdStatement(/insert into photo_facts/),
    worker.database.holdStatement(/set state = 'issued'/),
  ];
  const [checked, pictured] = [await openBatch(story), await openBatch(story)];
  await putWorkbook(story, checked, await oneLine(story, structureNumber)).expect(202);
  await postPhoto(story, pictured, `${structureNumber} finish.jpg`, SMALL);
  await putWorkbook(story, pictured, await oneLine(story, structureNumber)).expect(202);
  const asked = await askTransmittal(story);
  await Promise.all(holds.map((hold) => hold.reached));
  return { checked, pictured, transmittalId: asked.body.id, holds };
}

/** Below the demo standard's least longer edge of 1,000 px: the check of a picture that was prepared says so. */
export const SMALL = { width: 800, height: 600 };

/** What the pages say of the three now. */
export const ALL_DONE = {
  states: ['done', 'checked', 'ready', 'issued'],
  small: [800],
  problems: [null, null, null],
};

export async function readAll(story: Story, { checked, pictured, transmittalId }: UnderWay) {
  const check = (await story.contractor.get(`${checked.path}/check`)).body;
  const batch = (await story.contractor.get(checked.path)).body;
  const photo = (await story.contractor.get(`${pictured.path}/photos`)).body.items[0];
  const transmittal = (await story.clerk.get(`/api/transmittals/${transmittalId}`)).body;
  const findings = (await story.contractor.get(`${pictured.path}/findings?code=photo-small`)).body.items;
  return {
    states: [check.state, batch.status, photo.state, transmittal.state],
    small: (findings as FindingRow[]).map((finding) => finding.measured),
    problems: [check.problem?.detail ?? null, photo.problem, transmittal.problem],
  };
}

/** What is worked on now gets no further attempt. */
export async function makeLastAttempts(stage: FaultStage): Promise<void> {
  await run(stage.em(), `update pgboss.job set retry_limit = retry_count where state = 'active'`);
}
