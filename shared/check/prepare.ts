import { byText, canonical } from '#shared/records/canonical.ts';
import { cleanRow, type CleanRow } from '#shared/records/clean-row.ts';
import { linkRows, type LinkTarget } from '#shared/records/link-rows.ts';
import { rowContent } from '#shared/records/row-content.ts';
import { occurrences } from '#shared/records/occurrences.ts';
import type { SourceBatch } from '#shared/records/types.ts';
import { clockFields } from '#shared/rules/clock-chain.ts';
import type { CheckContext, LineEvent } from '#shared/rules/types.ts';
import { isSibling } from './context-keys.ts';
import type { Clock } from './instants.ts';
import { ambiguousKind, duplicateEvent, orphanRow } from './link-issues.ts';
import type { PlacedIssue, Prepared, PreparedLine } from './prepared.ts';
import { toPour } from './to-pour.ts';

type Target = LinkTarget & { readonly row: CleanRow; readonly broken: Set<string> };

const numberText = (value: unknown): string =>
  String(typeof value === 'number' ? value : 999).padStart(3, '0');

/** By event, pour number, then content: no figure may hang on the order of rows, not even by its last digit. */
const contentOrder = (rows: readonly CleanRow[]): readonly CleanRow[] => {
  if (rows.length < 2) return rows;
  const keyed = rows.map((row) => {
    const { event = 1, pourNumber } = row.values;
    return { row, numbers: `${numberText(event)} ${numberText(pourNumber)}`, content: '' };
  });
  // Rows that their numbers tell apart, as nearly all, are not written out whole.
  const contentOf = (one: (typeof keyed)[number]): string =>
    (one.content ||= `${canonical(one.row.values)} ${rowContent(one.row.source)}`);
  return keyed
    .toSorted((a, b) => byText(a.numbers, b.numbers) || byText(contentOf(a), contentOf(b)))
    .map(({ row }) => row);
};

const eventsOf = (target: Target, rows: readonly CleanRow[], clock: Clock) => {
  const events = new Map<number, LineEvent>();
  const twice: CleanRow[] = [];
  for (const row of contentOrder(rows)) {
    const event = row.values['event'];
    if (typeof event !== 'number') continue;
    if (events.has(event)) {
      twice.push(row);
      continue;
    }
    const instants = clock.instants(row.values, clockFields(target.kind, event));
    events.set(event, { event, source: row.source, values: row.values, broken: row.broken, instants });
  }
  return { events: [...events.values()].toSorted((a, b) => a.event - b.event), twice };
};

/** Names a row of a line by what it says, so that moving it changes nothing. */
export const rowPart = ({ values }: CleanRow): string =>
  ['structureNumber', 'event', 'pourNumber', 'lot', 'kitFt3', 'fileName']
    .flatMap((field) => (values[field] === undefined ? [] : [`${field} ${values[field]}`]))
    .join(' ');

/** Rows to records: values cleaned by their schemas, pours and events linked to lines, and what stood in the way. */
export const prepare = (source: SourceBatch, context: CheckContext, clock: Clock): Prepared => {
  const numbers = occurrences(source.lines);
  const targets: Target[] = source.lines.map((line) => {
    const row = cleanRow(line, line.kind);
    const number = row.values['structureNumber'];
    return {
      kind: line.kind,
      structureNumber: typeof number === 'string' ? number : '',
      occurrence: numbers.get(line) ?? 1,
      row,
      broken: new Set(row.broken),
    };
  });
  const pourRows = source.pours.map((row) => cleanRow(row, 'pour'));
  const eventRows = source.events.map((row) => cleanRow(row, 'event'));
  const photoRows = source.photos.map((row) => cleanRow(row, 'photo'));
  const pours = linkRows(pourRows, targets);
  const events = linkRows(eventRows, targets);
  const photos = linkRows(photoRows, targets);

  // A line is not told that it has no pours when there are rows that may be its own.
  for (const { lines } of pours.ambiguous) for (const line of lines) line.broken.add('pours');
  for (const target of targets) if (target.occurrence > 1) target.broken.add('pours');

  const issues: PlacedIssue[] = [];
  const owner = new Map<CleanRow, PreparedLine>();
  const lines = targets.map((target): PreparedLine => {
    const { events: lineEvents, twice } = eventsOf(target, events.of.get(target) ?? [], clock);
    const rows = contentOrder(pours.of.get(target) ?? []);
    const line = { ...target, pours: rows.map((row) => toPour(row, clock)), events: lineEvents };
    for (const row of [...rows, ...(events.of.get(target) ?? [])]) owner.set(row, line);
    issues.push(...target.row.issues.map((issue) => ({ issue, row: target.row, line, part: '' })));
    issues.push(...twice.map((row) => ({ issue: duplicateEvent(row), row, line, part: rowPart(row) })));
    return line;
  });
  const place = (row: CleanRow): readonly PlacedIssue[] =>
    row.issues.map((issue) => ({ issue, row, line: owner.get(row) ?? null, part: rowPart(row) }));
  const batch = cleanRow(source.batch, 'batch');
  for (const row of [batch, ...pourRows, ...eventRows, ...photoRows]) issues.push(...place(row));
  for (const { row } of [...pours.ambiguous, ...events.ambiguous])
    issues.push({ issue: ambiguousKind(row), row, line: null, part: rowPart(row) });
  const strays = [
    ...events.orphans.map((row) => ({ row, issue: orphanRow(row) })),
    ...photos.orphans.map((row) => ({ row, issue: orphanRow(row, 'note') })),
  ].filter(({ row }) => !isSibling(context, row));
  issues.push(...strays.map(({ row, issue }) => ({ issue, row, line: null, part: rowPart(row) })));

  return {
    batch,
    lines,
    pours: pourRows.map((row) => toPour(row, clock)),
    orphans: pours.orphans.filter((row) => !isSibling(context, row)).map((row) => toPour(row, clock)),
    issues,
  };
};
