import { buffer } from 'node:stream/consumers';
import { describe, expect, it, vi } from 'vitest';
import { textWidth } from '#shared/drawing/text-width.ts';
import type { FindingRow, RecordSheetData } from '#shared/generated/api-types.ts';
import { createPdf } from './create-pdf.ts';
import { layOutSheet } from './lay-out-sheet.ts';
import { PAPER_SIZES, type Paper } from './paper.ts';
import { readPdfForTests } from './read-pdf-for-tests.ts';
import type { SheetContent } from './sheet-content.ts';
import { markWriter } from './write-marks.ts';
import { writePages } from './write-pages.ts';

// Fonts are read and packed for each file: slow on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const finding = (number: number): FindingRow => ({
  id: `f${number}`,
  recordId: 'r1',
  lineId: 'l1',
  kind: 'set',
  code: 'embedment-short',
  title: 'Embedment short',
  severity: 'nonconformity',
  structureNumber: '17-0417',
  sheet: 'Set',
  row: 9,
  cell: 'H9',
  field: 'embedmentFt',
  measured: 5.8,
  limit: 6,
  margin: -0.2,
  unit: 'ft',
  uncertainty: null,
  params: {},
  message: 'The pole stands 5.8 ft deep where 6 ft is due.',
  remedy: 'Dig deeper.',
  answer: { text: 'Rock at 5.8 ft.', by: 'M. Vance', at: '2026-04-15T15:00:00.000Z' },
  state: 'approved',
  decision: {
    decision: 'approve',
    grounds: 'evidence',
    action: null,
    dueOn: null,
    reason: 'The photograph reads 6 ft.',
    by: 'R. Osei',
    at: '2026-04-16T15:30:00.000Z',
  },
  concession: null,
  version: 1,
  can: [],
});

function content(findings: number): SheetContent {
  const data = {
    record: {
      id: 'r1',
      kind: 'set',
      structureNumber: '17-0417',
      state: 'approved',
      values: {
        ground: 'soil',
        boreTopIn: 20,
        boreDepthFt: 6,
        embedmentFt: 5.8,
        diameterGroundLineIn: 11,
        diameterButtIn: 12,
        foamTopBelowGradeIn: 0,
        waterIn: 0,
      },
      derived: {
        voidFt3: 8.7,
        placedFt3: 9.5,
        fillRatio: 1.09,
        fillRatioU: 0.08,
        dueFt: 6,
        waterWithPoleIn: 0,
        leastAnnulusIn: 4,
        poleTaped: true,
        worstReading: null,
      },
      decision: { decision: 'approve', reason: null, by: 'R. Osei', at: '2026-04-16T15:40:00.000Z' },
    },
    pours: [],
    events: [],
    findings: Array.from({ length: findings }, (_, index) => finding(index + 1)),
    photos: [
      {
        view: 'bore-depth',
        fileName: '17-0417 bore-depth.jpg',
        takenAt: '2026-04-14T10:19',
        distanceFt: 11,
        sha256: 'ab12cd34ef56ab78'.repeat(4),
      },
    ],
    batch: { number: '17-06' },
    titleBlock: {
      owner: 'Larkmoor Electric Cooperative',
      workOrder: '17',
      structure: '17-0417',
      kind: 'Set, soil',
      pole: '40 ft class 4, pine',
      measuredOn: '2026-04-14T10:42',
      standard: '3',
      revision: '1',
      decided: 'approved',
      sheet: '6 of 38',
    },
    registerEntry: { recordNumber: 'R-000012', version: 1 },
  } as unknown as RecordSheetData;
  return { data, limits: { waterMostIn: 2 }, zone: 'America/Chicago' };
}

async function pdfOf(of: SheetContent, paper: Paper) {
  const doc = createPdf({
    paper,
    title: 'Record sheet',
    author: 'Larkmoor',
    madeAt: new Date('2026-04-20T00:00:00Z'),
  });
  const pages = layOutSheet(of, paper);
  writePages(doc, { pages, first: 1, total: pages.length, write: markWriter(doc) });
  doc.end();
  return readPdfForTests(await buffer(doc));
}

describe('the PDF of a record sheet', () => {
  it('carries its fonts, draws in vectors, and is on US Letter or A4', async () => {
    const letter = await pdfOf(content(1), 'letter');
    expect([letter.fonts.toSorted(), letter.embedded, letter.pictures]).toEqual([
      ['NotoSans-Regular', 'NotoSans-SemiBold'],
      2,
      0,
    ]);
    // 8.5 × 11 in and 210 × 297 mm in points.
    expect(letter.mediaBoxes).toEqual(['0 0 612 792']);
    expect((await pdfOf(content(1), 'a4')).mediaBoxes).toEqual(['0 0 595.28 841.89']);
  });

  it('says what the drawing, the title block and the lists say', async () => {
    const { pages } = await pdfOf(content(1), 'letter');
    for (const words of [
      '5.80 ft  embedment',
      'Larkmoor Electric Cooperative',
      '6 of 38',
      'measured 5.8 ft, limit 6 ft, margin −0.2 ft',
      'Answer of M. Vance, 15 Apr 2026: Rock at 5.8 ft.',
      // 15:30 UTC is 10:30 in Chicago in April (daylight time, UTC−5).
      'Approved on evidence by R. Osei, 16 Apr 2026, 10:30: The photograph reads 6 ft.',
      'On record as R-000012, version 1.',
      '17-0417 bore-depth.jpg',
      'ab12cd34ef56ab78',
      'page 1 of 1',
    ])
      expect(pages.join('\n')).toContain(words);
  });

  it('goes on over as many pages as its findings take, each numbered, none overfull', async () => {
    const of = content(30);
    for (const paper of ['letter', 'a4'] as const) {
      const { pages } = await pdfOf(of, paper);
      expect(pages.length).toBeGreaterThan(2);
      pages.forEach((page, index) => expect(page).toContain(`page ${index + 1} of ${pages.length}`));
      const foot = PAPER_SIZES[paper].height - 34;
      const lowest = layOutSheet(of, paper).flatMap((page) =>
        page.groups.flatMap((group) =>
          group.marks.map((mark) => (mark.is === 'text' ? group.y + mark.y * group.scale : 0)),
        ),
      );
      expect(Math.max(...lowest)).toBeLessThan(foot);
    }
  });

  it('says in words what the figure shows, for whoever does not see it', () => {
    const [first] = layOutSheet(content(0), 'letter');
    expect(first?.groups[0]?.alt).toContain('Section through structure 17-0417, a pole set in soil.');
  });
});

it('reckons with the widths of the letters that a PDF carries', () => {
  const doc = createPdf({ paper: 'letter', title: '', author: '', madeAt: new Date(0) });
  const letters = `${Array.from({ length: 95 }, (_, index) => String.fromCharCode(32 + index)).join('')}°±²³·×½–—‘’“”…−`;
  for (const [font, bold] of [
    ['regular', false],
    ['semibold', true],
  ] as const) {
    const wrong = Array.from(letters).filter(
      (letter) =>
        Math.abs(doc.font(font).fontSize(1000).widthOfString(letter) - textWidth(letter, 1000, bold)) > 0.6,
    );
    expect(wrong).toEqual([]);
  }
});
