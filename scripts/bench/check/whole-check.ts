import { numberOf, VIEWS } from './bench-workbook.ts';
import { startCheckProcess } from '#server/modules/check/check-process.ts';
import type { PhotoToPlace } from '#server/modules/check/load-photos.ts';
import { DEMO_PRODUCT } from '#shared/standard/demo.ts';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import type { Structures } from './run-steps.ts';

type Found = { code: string; structure_number: string };

const RUN = {
  id: '00000000-0000-4000-8000-000000000001',
  revisionId: '00000000-0000-4000-8000-000000000002',
  input: 1,
  n: 0,
  batchId: '00000000-0000-4000-8000-000000000003',
  batchNumber: 'BENCH-1',
  contractorId: '00000000-0000-4000-8000-000000000004',
  workOrderId: '00000000-0000-4000-8000-000000000005',
  asOfMs: Date.parse('2026-12-01T00:00:00Z'),
};

/** The check as the worker has it done, but for the queries before it and the inserts after it. */
export async function wholeCheck(
  file: string,
  lines: number,
): Promise<Structures & { readonly findings: number }> {
  const {
    photos: _photos,
    siblings: _siblings,
    lots: _lots,
    design: _design,
    previous: _previous,
    ...known
  } = DEMO_CONTEXT;
  const checking = startCheckProcess(file, new AbortController().signal);
  try {
    await checking.needs();
    await checking.compute({
      frame: {
        run: RUN,
        orderNumber: 'BENCH',
        lots: [
          { id: RUN.id, product: DEMO_PRODUCT.code, number: 'LK-2291', expiresOn: null, status: 'in-use' },
        ],
        context: {
          ...known,
          asOfMs: RUN.asOfMs,
          lotUse: [],
          neighbours: [],
          area: 'none',
          otherPhotos: [],
          register: new Map(),
        },
      },
      lists: { lines: [], design: designList(lines), previous: [] },
      photos: photographs(lines),
    });
    const found: Record<string, string[]> = {};
    let findings = 0;
    for await (const { table, text, rows } of checking.documents()) {
      if (table !== 'findings') continue;
      findings += rows;
      for (const { code, structure_number } of JSON.parse(text) as Found[])
        (found[code] ??= []).push(structure_number);
    }
    return {
      findings,
      'fill-short': found['fill-short'] ?? [],
      'embedment-short': found['embedment-short'] ?? [],
    };
  } finally {
    checking.end();
  }
}

const designList = (lines: number) =>
  Array.from({ length: lines }, (_, index) => ({
    structureNumber: numberOf(index),
    kind: 'set' as const,
    poleLengthFt: 40,
    poleClass: '4',
    poleMaterial: 'southern-pine',
    embedmentFt: null,
    latitude: null,
    longitude: null,
  }));

/** Four a line, by name, page by page as they come from the database. */
async function* photographs(lines: number): AsyncGenerator<readonly PhotoToPlace[]> {
  const PAGE = 500;
  for (let from = 0; from < lines; from += PAGE)
    yield Array.from({ length: Math.min(PAGE, lines - from) }, (_, n) =>
      VIEWS.map((view) => {
        const fileName = `${numberOf(from + n)} ${view}.jpg`;
        return {
          id: fileName,
          fileName,
          sha256: fileName,
          seq: 0,
          lineId: null,
          view: null,
          method: null,
          removed: false,
          facts: null,
        };
      }),
    ).flat();
}
