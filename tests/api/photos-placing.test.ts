import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { rows } from '#server/db/rows.ts';
import type { Photo } from '#shared/generated/api-types.ts';
import { pourRows, SET_VIEWS, setRow } from '#tests/factories/set-row.ts';
import {
  findingsOf,
  recordsOf,
  startBatch,
  uploadPhotographs,
  uploadWorkbook,
  type HandedIn,
} from '#tests/factories/start-batch.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Agent, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let foreign: Agent;
let batch: HandedIn;
beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: ['L-1', 'L-2'] });
  contractor = await harness.signIn(site.contractor);
  foreign = await harness.signIn('contractor');
});
afterAll(() => harness.close());
beforeEach(async () => {
  batch = await startBatch(contractor, site);
});

const upload = (
  photos: readonly { fileName: string; structureNumber: string; view: string }[] = [],
  values = {},
) =>
  uploadWorkbook(harness, contractor, {
    batch,
    site,
    workbook: {
      set: [setRow('L-1', values), setRow('L-2')],
      pours: [...pourRows('L-1', site.lot.number), ...pourRows('L-2', site.lot.number)],
      photos,
    },
  });
const photos = async (): Promise<Photo[]> => (await contractor.get(`${batch.path}/photos`)).body.items;
const places = async () =>
  Object.fromEntries(
    (await photos()).map((photo) => [
      photo.fileName,
      photo.lineId && [photo.structureNumber, photo.view, photo.method],
    ]),
  );

describe('photographs come to lie', () => {
  it('by the Photos sheet before the file name, by the name, or nowhere', async () => {
    await uploadPhotographs(contractor, batch, [
      'IMG_0001.jpg',
      'L-1 kits.jpg',
      'l2_Bore-Depth.JPG',
      'kits.jpg',
    ]);
    await upload([
      { fileName: 'IMG_0001.jpg', structureNumber: 'L-1', view: 'plumb' },
      { fileName: 'L-1 kits.jpg', structureNumber: 'L-2', view: 'kits' },
    ]);
    expect(await places()).toEqual({
      'IMG_0001.jpg': ['L-1', 'plumb', 'sheet'],
      'L-1 kits.jpg': ['L-2', 'kits', 'sheet'],
      'l2_Bore-Depth.JPG': ['L-2', 'bore-depth', 'name'],
      'kits.jpg': null,
    });
    expect((await contractor.get(batch.path)).body.counts).toMatchObject({ photos: 4, unplacedPhotos: 1 });
  });

  it('anew after a new workbook', async () => {
    await uploadPhotographs(contractor, batch, ['IMG_0001.jpg']);
    await upload([{ fileName: 'IMG_0001.jpg', structureNumber: 'L-1', view: 'plumb' }]);
    await upload([{ fileName: 'img_0001', structureNumber: 'L-2', view: 'finish' }]);
    expect(await places()).toEqual({ 'IMG_0001.jpg': ['L-2', 'finish', 'sheet'] });
    await upload();
    expect(await places()).toEqual({ 'IMG_0001.jpg': null });
  });

  it('where a hand put them, whatever a later workbook says', async () => {
    const { files } = await uploadPhotographs(contractor, batch, ['IMG_0001.jpg']);
    await upload();
    const missing = async () =>
      (await findingsOf(contractor, batch, '&structure=L-1')).map((one) => one.limit);
    expect(new Set(await missing())).toEqual(new Set(SET_VIEWS));
    const [line] = await recordsOf(contractor, batch);
    const match = `/api/photos/${files[0]?.id}/match`;
    const placed = await contractor.put(match).send({ lineId: line?.lineId, view: 'plumb' });
    expect(placed.body).toMatchObject({
      structureNumber: 'L-1',
      view: 'plumb',
      method: 'hand',
      can: ['place', 'take-off'],
    });
    expect((await contractor.get(batch.path)).body).toMatchObject({ status: 'checking', input: 3 });
    await harness.drain();
    expect(new Set(await missing())).toEqual(new Set(['bore-depth', 'kits', 'finish']));
    await upload([{ fileName: 'IMG_0001.jpg', structureNumber: 'L-2', view: 'finish' }]);
    expect(await places()).toEqual({ 'IMG_0001.jpg': ['L-1', 'plumb', 'hand'] });

    const off = await contractor.delete(match);
    expect(off.body).toMatchObject({ lineId: null, view: null, can: ['place'] });
    await harness.drain();
    expect(await places()).toEqual({ 'IMG_0001.jpg': null });
    const trail = await rows<{ action: string }>(
      harness.em(),
      `select action from trail where subject_type = 'photo' and subject_id = $1 order by seq`,
      [files[0]?.id],
    );
    expect(trail.map((entry) => entry.action)).toEqual(['photo.placed', 'photo.taken-off']);
  });
});

describe('placing by hand', () => {
  it('is refused on another batch’s line, an unknown view, another contractor’s photograph, and after handing in', async () => {
    const { files } = await uploadPhotographs(contractor, batch, ['IMG_0001.jpg']);
    await upload();
    const [line] = await recordsOf(contractor, batch);
    const match = `/api/photos/${files[0]?.id}/match`;
    const body = { lineId: line?.lineId, view: 'plumb' };
    expect((await foreign.put(match).send(body)).status).toBe(404);
    expect((await foreign.delete(match)).status).toBe(404);
    const stranger = await contractor.put(match).send({ ...body, lineId: batch.id });
    expect(stranger.body).toMatchObject({ status: 422, errors: [{ pointer: '/lineId' }] });
    const view = await contractor.put(match).send({ ...body, view: 'selfie' });
    expect(view.body).toMatchObject({ status: 400, errors: [{ pointer: '/view' }] });
    await contractor.post(`${batch.path}/submit`);
    expect((await contractor.put(match).send(body)).body).toMatchObject({
      status: 409,
      code: 'revision.frozen',
    });
  });
});
