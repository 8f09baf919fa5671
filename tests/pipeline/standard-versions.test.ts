import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { createStandard } from '#tests/factories/standards.ts';
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

/** A batch that spans two versions of the standard, and a third one that comes later. */

const APRIL = 'L-1';
const MAY = 'L-2';
const { rules } = DEMO_STANDARD;
let harness: Harness;
let site: WorkSite;
let contractor: Agent;
let inspector: Agent;
let batch: HandedIn;

const publish = async (effectiveOn: string, changed: object): Promise<void> => {
  const [author, approver] = [await harness.person('engineer'), await harness.person('engineer')];
  await createStandard(harness.em(), {
    authorId: author.id,
    approverId: approver.id,
    effectiveOn,
    body: { ...DEMO_STANDARD, rules: { ...rules, ...changed } },
  });
};
/** 0.8 in of lean in 10 ft; the brand, 10 ft from the butt, says 4.6 ft in the ground where 6 ft are written down. */
const DONE = { leanInPer10Ft: 0.8, leanAzimuthDeg: 90, brandHeightFt: 5.4 };
const inMay = <T extends object>(row: T): T =>
  JSON.parse(JSON.stringify(row).replaceAll('"2026-04-', '"2026-05-')) as T;
const upload = () =>
  uploadWorkbook(harness, contractor, {
    batch,
    site,
    workbook: {
      set: [setRow(APRIL, DONE), inMay(setRow(MAY, DONE))],
      pours: [...pourRows(APRIL, site.lot.number), ...pourRows(MAY, site.lot.number).map(inMay)],
    },
  });
const judged = async (agent: Agent, query = '') => ({
  standards: (await recordsOf(agent, batch, query)).map((line) => [line.structureNumber, line.standard]),
  findings: (await findingsOf(agent, batch, query))
    .filter(({ code, severity }) => severity !== 'note' && !code.startsWith('photo-'))
    .map((one) => [one.structureNumber, one.code, one.limit, one.severity]),
});
const rulesOff = async (agent: Agent) =>
  (await agent.get(`${batch.path}/revisions`)).body.items.map((one: { rulesOff: unknown }) => one.rulesOff);

/** 0.8 in per 10 ft: within 1 of version 1, over the 0.5 of version 2, which has the brand's rule on and lean as a query. */
const TWO_VERSIONS = {
  standards: [
    [APRIL, 1],
    [MAY, 2],
  ],
  findings: [
    [MAY, 'brand-differs', 0.5, 'query'],
    [MAY, 'plumb-out', 0.5, 'query'],
  ],
};
const BRAND_OFF = [{ code: 'brand-differs', title: 'Brand differs', standards: [1] }];

beforeAll(async () => {
  harness = await createHarness();
  site = await createWorkSite(harness, { planned: [APRIL, MAY] });
  await publish('2026-05-01', {
    'plumb-out': {
      ...rules['plumb-out'],
      severity: 'query',
      params: { ...rules['plumb-out'].params, limitInPer10Ft: 0.5 },
    },
    'brand-differs': { ...rules['brand-differs'], on: true },
  });
  contractor = await harness.signIn(site.contractor);
  inspector = await harness.signIn('inspector');
  batch = await startBatch(contractor, site);
  await uploadPhotographs(
    contractor,
    batch,
    [APRIL, MAY].flatMap((name) =>
      ['bore-depth', 'kits', 'finish', 'plumb', 'brand'].map((view) => `${name} ${view}.jpg`),
    ),
  );
  await upload();
}, 120_000);
afterAll(() => harness.close());

describe('a batch over two versions of the standard', () => {
  it('is judged line by line on the version of its work day', async () => {
    expect(await judged(contractor)).toEqual(TWO_VERSIONS);
  });

  it('says which rule is off, in which version, to its contractor, and to its inspector once it is submitted', async () => {
    expect(await rulesOff(contractor)).toEqual([BRAND_OFF]);
    expect(await rulesOff(inspector)).toEqual([[]]);
    expect((await contractor.post(`${batch.path}/submit`)).status).toBe(200);
    expect(await rulesOff(inspector)).toEqual([BRAND_OFF]);
  });

  it('keeps what it was judged on when a later version is published', async () => {
    // In force from a day before the work of May: not for what was handed in already.
    await publish('2026-05-10', {
      'plumb-out': { ...rules['plumb-out'], params: { ...rules['plumb-out'].params, limitInPer10Ft: 0.1 } },
    });
    expect(await judged(inspector)).toEqual(TWO_VERSIONS);
    await inspector.post(`${batch.path}/take`);
    for (const finding of await findingsOf(inspector, batch)) {
      if (finding.severity === 'note') continue;
      const reply = await inspector
        .put(`/api/findings/${finding.id}/decision`)
        .set('If-Match', `"${finding.version}"`)
        .send({ decision: 'reject', action: 'correct', reason: 'Measure again.', dueOn: '2099-05-01' });
      expect(reply.status).toBe(200);
    }
    await inspector.post(`${batch.path}/approve-clean`);
    expect((await inspector.post(`${batch.path}/close-review`)).status).toBe(200);
    // The returned line comes again, still judged by what was in force when it was first handed in.
    await upload();
    const again = await judged(contractor);
    expect(again.standards).toEqual([[MAY, 2]]);
    expect(again.findings).toEqual(TWO_VERSIONS.findings);
  });
});
