import { rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { tempFolder } from '#scripts/lib/temp-folder.mjs';
import { readWorkbookFile } from '#server/workbook/read-workbook-file.ts';
import { checkBatch } from '#shared/check/check-batch.ts';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import type { CheckContext, PhotoFact } from '#shared/rules/types.ts';
import { readSource } from '#shared/workbook/read-source.ts';
import { makeWorkbook } from '../make-batch-files.ts';
import { BATCHES } from './batches.ts';
import { type StoryLine, buildBatchRows } from './build-batch-rows.ts';
import { LOTS } from './lots.ts';
import { WORK_ORDERS } from './work-orders.ts';

const folder = tempFolder('upstand-story-');
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** Through a real workbook, with what the demo's database would know; `structure rule`, in order. */
async function findingsOf(workOrder: string, lines: readonly StoryLine[]): Promise<string[]> {
  const rows = buildBatchRows({ workOrder, lines });
  const file = path.join(folder, `${lines[0]!.structureNumber}-${lines.length}.xlsx`);
  writeFileSync(file, (await makeWorkbook(rows, 'story.xlsx')).bytes);
  const photos = new Map<string, PhotoFact[]>();
  for (const { fileName, subject, capture } of rows.photographs) {
    const key = `${subject.kind}|${subject.structureNumber}|1`;
    photos.set(key, [
      ...(photos.get(key) ?? []),
      {
        id: fileName,
        fileName,
        sha256: fileName,
        view: subject.view,
        // As they are drawn: draw-photograph.ts.
        facts: {
          takenWall: capture.takenAt,
          takenAtMs: Date.parse(`${capture.takenAt}${capture.offset}`),
          latitude: capture.latitude,
          longitude: capture.longitude,
          width: 1600,
          height: 1200,
          phash: null,
        },
      },
    ]);
  }
  const context: CheckContext = {
    ...DEMO_CONTEXT,
    asOfMs: Date.UTC(2026, 6, 1),
    lots: LOTS.map(({ product, number, expiresOn, event }) => ({
      product,
      number,
      expiresOn,
      status: event?.type ?? 'in-use',
      history: event ? [{ on: event.on, status: event.type }] : [],
    })),
    lotUse: LOTS.map(({ product, number, received }) => ({
      product,
      number,
      sizes: received.map(({ kitFt3, quantity }) => ({ kitFt3, received: quantity, used: 0, own: 0 })),
    })),
    design: WORK_ORDERS.find((order) => order.number === workOrder)!.planned.map(
      ({ structureNumber, kind, design }) => ({ structureNumber, kind, ...design }),
    ),
    neighbours: [],
    area: 'none',
    photos,
    otherPhotos: [],
    register: new Map(),
    previous: new Map(),
    siblings: new Set(),
  };
  const { findings } = checkBatch(readSource(await readWorkbookFile(file)), context);
  return findings.map((finding) => `${finding.structureNumber} ${finding.code}`);
}

describe('what the demo’s batches are found to be', () => {
  const expected: Record<string, string[]> = {
    'first on record': ['17-0403 embedment-short', '17-0405 crown-low'],
    'returned in part': ['17-0407 fill-short', '17-0409 lot-unknown'],
    'under review': [
      '17-0415 photo-missing',
      '17-0417 embedment-short',
      '17-0417 hardware-early',
      '17-0417 water-deep',
      '17-0418 fill-excess',
    ],
    'waiting in the queue': ['17-0420 annulus-narrow', '17-0422 unproved'],
    'being put together': [
      '17-0424 fill-short',
      '17-0425 record-unreadable',
      '17-0426 clock-order',
      '17-0427 photo-missing',
    ],
    'decided, not yet entered': ['18-0102 hardware-early'],
    'concession asked': ['18-0106 water-deep'],
    'repairs on record': ['17-0440 pad-slope'],
    'three kinds under review': ['17-0433 lean-left', '17-0441 gap-plane'],
  };

  it.each(BATCHES.filter((batch) => batch.state !== 'draft'))('$key', async ({ key, workOrder, lines }) => {
    expect((await findingsOf(workOrder, lines)).sort()).toEqual(expected[key]);
  });

  it('comes back corrected', async () => {
    const { workOrder, next } = BATCHES.find((batch) => batch.next)!;
    expect(await findingsOf(workOrder, next!.lines)).toEqual([]);
  });
});
