import { row, run } from '#server/db/rows.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import type { KnownBeside } from '#shared/check/known-beside.ts';
import type { Photo } from '#shared/generated/api-types.ts';
import { createLot } from '#tests/factories/foam.ts';
import { photograph } from '#tests/factories/photograph.ts';
import { giveFacts, photographWithHash, sha256Of } from '#tests/factories/photo-facts.ts';
import { placeOf } from '#tests/factories/place.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { createStandard } from '#tests/factories/standards.ts';
import { recordsOf, startBatch, type HandedIn } from '#tests/factories/start-batch.ts';
import { createWorkOrder } from '#tests/factories/work-orders.ts';
import type { WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import {
  ALIKE_HASH,
  ELSEWHERE,
  everyRuleBeside,
  ON_RECORD,
} from '#tests/fixtures/parity/every-rule-beside.ts';
import { BY_HAND, EVERY_SHOT, exifOf } from '#tests/fixtures/parity/every-rule-photos.ts';
import { earlierWorkbook, EVERY_PLANNED, TWICE } from '#tests/fixtures/parity/every-rule.ts';
import { createOnRecord } from '#tests/pipeline/on-record.ts';
import { createOtherFoam } from '#tests/pipeline/other-foam.ts';
import { AREA, LOT } from '#tests/pipeline/rule-case.ts';
import type { Agent, Stage } from '#tests/setup/api-harness.ts';

export type EveryRuleSite = {
  readonly site: WorkSite;
  /** With its photographs and an earlier upload; the mixed workbook is still to come. */
  readonly batch: HandedIn;
  readonly beside: KnownBeside;
};

const BAND = 0xaaaa;

/** The order that all is planned on, with its lots, its area and what others have on record. */
async function makeOrder(server: Stage, { contractor, product, lot }: WorkSite): Promise<WorkSite> {
  const em = server.em();
  const order = await createWorkOrder(em, { contractorId: contractor.orgId, planned: EVERY_PLANNED });
  await run(em, 'update work_orders set area = $2 where id = $1', [order.id, JSON.stringify(AREA)]);
  await createLot(em, { productId: product.id, number: LOT });
  await createOtherFoam(em, product.id);
  for (const one of ON_RECORD) await createOnRecord(server, one);
  await run(
    em,
    `insert into planned (work_order_id, structure_id, kind, design)
     select $1, id, 'set', $3 from structures where number = $2`,
    [order.id, 'F-41', JSON.stringify({ poleLengthFt: 40, poleClass: '4', ...placeOf('F-41') })],
  );
  const [author, approver] = [await server.person('engineer'), await server.person('engineer')];
  const signed = { authorId: author.id, approverId: approver.id };
  const brand = { ...DEMO_STANDARD.rules['brand-differs'], on: true };
  const body = { ...DEMO_STANDARD, rules: { ...DEMO_STANDARD.rules, 'brand-differs': brand } };
  // For two days of May the owner asks for brands.
  await createStandard(em, { ...signed, effectiveOn: '2026-05-04', body });
  await createStandard(em, { ...signed, effectiveOn: '2026-05-06' });
  return { contractor, order, product, lot };
}

export async function makeEveryRuleSite(
  server: Stage,
  options: { readonly agent: Agent; readonly site: WorkSite },
): Promise<EveryRuleSite> {
  const { agent } = options;
  const site = await makeOrder(server, options.site);
  const send = async (batch: HandedIn, files: readonly (readonly [name: string, bytes: Buffer])[]) => {
    const form = agent.post(`${batch.path}/photos`);
    for (const [name, bytes] of files) form.attach('photos', bytes, name);
    const reply = await form;
    if (reply.status !== 202) throw new Error(`The photographs were refused: ${reply.text}`);
  };
  const upload = async (batch: HandedIn, bytes: Buffer) => {
    const reply = await agent.put(`${batch.path}/workbook`).attach('workbook', bytes, 'batch.xlsx');
    if (reply.status !== 202) throw new Error(`The workbook was refused: ${reply.text}`);
    await server.drain();
  };

  const reused = await photograph({ height: 8 });
  const others = await photographWithHash(server.em(), { phash: ALIKE_HASH, band: BAND });
  const first = await startBatch(agent, site);
  await send(first, [
    [`${ELSEWHERE} finish.jpg`, reused],
    [`${ELSEWHERE} plumb.jpg`, others],
  ]);
  await upload(
    first,
    await workbookFile({
      workOrder: site.order.number,
      set: [setRow(ELSEWHERE)],
      pours: pourRows(ELSEWHERE, site.lot.number),
    }),
  );

  const alike = await photographWithHash(server.em(), { phash: 'aaaaaaaaaaaaaaf0', band: BAND });
  const given = { reused, alike };
  const shots = await Promise.all(
    EVERY_SHOT.map(async (shot) => {
      const { width, height } = shot.facts;
      const size = { width: width ?? 1, height: height ?? 1 };
      const picture =
        shot.bytes === 'own' ? await photograph({ ...size, exif: exifOf(shot.facts) }) : given[shot.bytes];
      return { ...shot, picture, sha256: sha256Of(picture) };
    }),
  );
  await giveFacts(
    server.em(),
    shots.filter(({ measured }) => !measured),
  );
  const batch = await startBatch(agent, site);
  await send(
    batch,
    shots.map(({ fileName, picture }) => [fileName, picture] as const),
  );
  await upload(batch, await earlierWorkbook(site));
  await placeByHand(agent, batch);
  await server.drain();
  return {
    site,
    batch,
    beside: everyRuleBeside({
      shots: shots.map(({ picture: _picture, ...shot }) => shot),
      reused: sha256Of(reused),
      alike: sha256Of(others),
      batch: first.number,
    }),
  };
}

/** The photographs that no name can place, on the second line of the structure that is there twice. */
async function placeByHand(agent: Agent, batch: HandedIn): Promise<void> {
  const lines = await recordsOf(agent, batch);
  const second = lines.find(({ structureNumber, row: at }) => structureNumber === TWICE && at === 6);
  const { body } = await agent.get(`${batch.path}/photos`);
  const photos = body.items as readonly Photo[];
  for (const { id, fileName } of photos) {
    const view = new RegExp(`^${BY_HAND} (.+)\\.jpg$`, 'u').exec(fileName)?.[1];
    if (view === undefined) continue;
    const reply = await agent.put(`/api/photos/${id}/match`).send({ lineId: second?.lineId, view });
    if (reply.status !== 200) throw new Error(`The photograph was not placed: ${reply.text}`);
  }
}

/** What was "now" to the rules at the batch's newest check. */
export async function checkedAt(server: Stage, batch: HandedIn): Promise<string> {
  const found = await row<{ at: string }>(
    server.em(),
    `select c.started_at as at from check_runs c join revisions v on v.id = c.revision_id
     where v.batch_id = $1 order by c.input desc limit 1`,
    [batch.id],
  );
  if (!found) throw new Error('The batch was not checked.');
  return new Date(found.at).toISOString();
}
