import { shownFinding } from '#shared/check/shown-finding.ts';
import type { CheckedRecord, CheckResult, Skipped } from '#shared/check/types.ts';
import { countFindings } from '#shared/findings/count-findings.ts';
import type { Finding } from '#shared/findings/types.ts';
import { say } from '#shared/findings/say.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import { SHEET_OF_KIND } from '#shared/records/types.ts';

const WIDTH = 100;

const REASON: Readonly<Record<Skipped['reason'], string>> = {
  off: 'off in the standard',
  'no-time': 'the time of hand-in is not known here',
  'no-lots': 'the lots are not known here',
  'no-lot-use': 'receipts and use of the lots are not known here',
  'no-design': 'the work order is not known here',
  'no-register': 'the register is not known here',
  'no-area': 'the area of the work order is not known here',
  'no-photos': 'photographs are not known here',
  'no-siblings': 'earlier revisions are not known here',
  'no-earlier-check': 'earlier checks are not known here',
  'own-only': 'ran on the contractor’s own structures alone',
};

const onlyIn = ({ standards }: Skipped): string =>
  standards ? `, version ${standards.join(' and ')} only` : '';

/** Breaks a text into lines that begin at a column. */
const wrap = (text: string, indent: number): string => {
  const lines = [''];
  for (const word of text.split(' ')) {
    const last = lines.at(-1) ?? '';
    if (last !== '' && indent + last.length + 1 + word.length > WIDTH) lines.push(word);
    else lines[lines.length - 1] = last === '' ? word : `${last} ${word}`;
  }
  return lines.join(`\n${' '.repeat(indent)}`);
};

const findingLines = (finding: Finding): string => {
  const { title, message, remedy } = shownFinding(finding);
  const place = finding.cell === null ? (finding.sheet ?? '') : `${finding.sheet} ${finding.cell}`;
  const head = `  ${finding.severity.padEnd(15)}${place.padEnd(14)}${title}  [${finding.code}]`;
  return [
    head,
    `  ${' '.repeat(15)}${wrap(message, 17)}`,
    `  ${' '.repeat(15)}${wrap(`→ ${remedy}`, 17)}`,
  ].join('\n');
};

const heading = ({ kind, structureNumber, row, derived, occurrence }: CheckedRecord): string => {
  const again = occurrence > 1 ? ` (line ${occurrence})` : '';
  const fill =
    derived.fillRatio === null
      ? 'fill ratio not known'
      : `fill ratio ${say(derived.fillRatio, 'ratio')} ± ${say(derived.fillRatioU, 'ratio')}`;
  const foam = `void ${say(derived.voidFt3, 'ft3')}, foam ${say(derived.placedFt3, 'ft3')}, ${fill}`;
  return `${structureNumber || '(no number)'}${again}  ${SHEET_OF_KIND[kind]} row ${row}  ${foam}`;
};

const plural = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;

/** The check for people: line by line, then what concerns the batch, what did not run, and counts. */
export const reportText = (result: CheckResult): string => {
  const byLine = new Map<string, Finding[]>();
  for (const finding of result.findings) {
    const key =
      finding.kind === null ? '' : lineKey(finding.kind, finding.structureNumber, finding.occurrence ?? 1);
    const group = byLine.get(key);
    if (group) group.push(finding);
    else byLine.set(key, [finding]);
  }
  const lines = result.records.map((record) => {
    const found = byLine.get(lineKey(record.kind, record.structureNumber, record.occurrence)) ?? [];
    return [heading(record), ...(found.length > 0 ? found.map(findingLines) : ['  nothing found'])].join(
      '\n',
    );
  });
  const batch = byLine.get('') ?? [];
  const skipped = result.skipped.map((one) => `  ${one.code.padEnd(19)}${REASON[one.reason]}${onlyIn(one)}`);
  const counts = countFindings(result.findings);
  return [
    ...lines,
    ...(batch.length > 0 ? [['The batch', ...batch.map(findingLines)].join('\n')] : []),
    ...(skipped.length > 0 ? [['Did not run', ...skipped].join('\n')] : []),
    `${plural(result.records.length, 'line', 'lines')}: ${[
      plural(counts.nonconformity, 'nonconformity', 'nonconformities'),
      plural(counts.query, 'query', 'queries'),
      plural(counts.note, 'note', 'notes'),
    ].join(', ')}.`,
  ].join('\n\n');
};
