import { formatDay } from '#shared/dates/format-day.ts';
import { formatInstant, formatWallClock } from '#shared/dates/format-moment.ts';
import { findingText } from '#shared/drawing/finding-text.ts';
import { inOrder, sheetFindings } from '#shared/drawing/number-findings.ts';
import { toneOf, type SheetFinding } from '#shared/drawing/sheet-types.ts';
import type { FindingRow, Photo } from '#shared/generated/api-types.ts';
import { viewWord } from '#shared/records/view-word.ts';
import { findingWord } from '#shared/review/finding-word.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';
import { cells, entry, heading, paragraph, type Piece } from './flow.ts';
import type { SheetContent } from './sheet-content.ts';

const INDENT = 18;

/** What stands under the drawing: findings with their decisions, the decision on the line, the photographs by name. */
export function sheetLists(content: SheetContent, width: number): Piece[] {
  return [
    ...findingPieces(content, width),
    ...decisionPieces(content, width),
    ...photoPieces(content, width),
  ];
}

function findingPieces({ data, zone }: SheetContent, width: number): Piece[] {
  const numbered = sheetFindings(data.findings);
  const notes = data.findings.filter((finding) => finding.severity === 'note');
  const pieces: Piece[] = [
    heading('Findings', { width, aside: numbered.length === 0 ? 'none' : String(numbered.length) }),
  ];
  inOrder(data.findings)
    .filter((finding) => finding.severity !== 'note')
    .forEach((finding, index) => {
      const drawn = numbered[index];
      if (drawn) pieces.push(findingPiece(finding, { drawn, width, zone }));
    });
  for (const note of notes)
    pieces.push(
      entry(
        [
          {
            runs: [
              { text: 'Note  ', tone: 'muted' },
              { text: note.title, bold: true },
            ],
          },
          ...paragraph(note.message, { width, indent: INDENT, tone: 'ink-2' }),
        ],
        width,
      ),
    );
  return pieces;
}

function findingPiece(
  finding: FindingRow,
  { drawn, width, zone }: { drawn: SheetFinding; width: number; zone: string },
): Piece {
  const figures = findingText(drawn, false);
  const { decision, answer } = finding;
  const under = { width, indent: INDENT };
  return entry(
    [
      {
        runs: [
          { text: `${drawn.number}  `, bold: true, tone: toneOf(drawn) },
          { text: finding.title, bold: true, tone: toneOf(drawn) },
          { text: finding.severity === 'query' ? '  query' : '  nonconformity', tone: 'muted' },
        ],
        aside: findingWord(finding)?.word ?? 'not decided',
      },
      ...(figures ? paragraph(figures, { ...under, tone: 'ink-2' }) : []),
      ...paragraph(finding.message, { ...under, tone: 'ink-2' }),
      ...(answer ? paragraph(`Answer of ${answer.by}, ${day(answer.at, zone)}: ${answer.text}`, under) : []),
      ...(decision ? paragraph(decisionText(decision, zone), under) : []),
    ],
    width,
  );
}

function decisionText(decision: NonNullable<FindingRow['decision']>, zone: string): string {
  const verb = decision.decision === 'approve' ? 'Approved' : 'Rejected';
  const grounds = decision.grounds ? ` on ${decision.grounds}` : '';
  const due = decision.dueOn ? `, due ${formatDay(decision.dueOn)}` : '';
  const reason = decision.reason ? `: ${decision.reason}` : '.';
  return `${verb}${grounds} by ${decision.by}, ${formatInstant(decision.at, zone)}${due}${reason}`;
}

function day(at: string, zone: string): string {
  return formatInstant(at, zone).replace(/,.*/, '');
}

function decisionPieces({ data, zone }: SheetContent, width: number): Piece[] {
  const { decision } = data.record;
  const lines = decision
    ? paragraph(
        `${decision.decision === 'approve' ? 'Approved' : 'Returned'} by ${decision.by}, ${formatInstant(decision.at, zone)}${decision.reason ? `: ${decision.reason}` : '.'}`,
        { width },
      )
    : paragraph('The line itself is not decided.', { width, tone: 'muted' });
  const entered = data.registerEntry
    ? paragraph(`On record as ${data.registerEntry.recordNumber}, version ${data.registerEntry.version}.`, {
        width,
      })
    : [];
  return [
    heading('Decision on the line', { width, aside: data.titleBlock.decided }),
    entry([...lines, ...entered], width),
  ];
}

function photoPieces({ data }: SheetContent, width: number): Piece[] {
  const { photos } = data;
  const pieces: Piece[] = [
    heading('Photographs', { width, aside: photos.length === 0 ? 'none' : String(photos.length) }),
  ];
  if (photos.length === 0) return pieces;
  const widths = [0.15, 0.27, 0.21, 0.15, 0.22].map((share) => share * width);
  return [
    ...pieces,
    {
      ...cells(['View', 'File', 'Taken', 'From position', 'SHA-256 begins'], { widths, tone: 'muted' }),
      heading: true,
    },
    ...photos.map((photo) => cells(photoCells(photo), { widths })),
  ];
}

function photoCells(photo: Photo): string[] {
  return [
    viewWord(photo.view),
    photo.fileName,
    photo.takenAt === null ? 'no capture time' : formatWallClock(photo.takenAt),
    photo.distanceFt === null ? 'no position' : formatQuantity(photo.distanceFt, 'ft', { digits: 0 }),
    photo.sha256.slice(0, 16),
  ];
}
