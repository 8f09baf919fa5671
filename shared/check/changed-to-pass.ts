import { RECORD_FIELDS } from '#shared/records/field-meta.ts';
import { byText, canonical } from '#shared/records/canonical.ts';
import type { FieldValues, Scalar, SourceRow } from '#shared/records/types.ts';
import type { EarlierFailure, FindingDraft, LineView } from '#shared/rules/types.ts';

/** Rules that rest on no measured value, or that say only that one is not there. */
const NOT_MEASURED =
  /^(?:photo-|lot-|kit-|not-on-|done-|already-|locate-missing|design-|product-|unproved|changed-)/;
/** How the cells of measured values are read; texts, codes and days name things and are not measured. */
const MEASURED = new Set([
  'length-ft',
  'length-in',
  'number',
  'temperature-f',
  'degrees',
  'integer',
  'clock',
]);
/** They tell a pour row, and measure nothing. */
const NAMES = new Set(['pourNumber', 'event']);

type Change = {
  readonly field: string;
  readonly title: string;
  readonly before: Scalar;
  readonly after: Scalar;
  readonly source: SourceRow;
};

const changesIn = (
  record: 'set' | 'straighten' | 'relevel' | 'pour',
  {
    before,
    after,
    source,
  }: { readonly before: FieldValues; readonly after: FieldValues; readonly source: SourceRow },
): readonly Change[] =>
  [...RECORD_FIELDS[record]].flatMap(([field, { read, title }]): Change[] => {
    const was = before[field] ?? null;
    const is = after[field] ?? null;
    // What was blank was not measured: filling it in is no change of it.
    if (was === null || was === is || !MEASURED.has(read) || NAMES.has(field)) return [];
    return [{ field, title, before: was, after: is, source }];
  });

/** Pour rows as first built; what a later event adds is no change of what was. */
const firstPours = (pours: readonly FieldValues[]): readonly FieldValues[] =>
  pours.filter(({ event }) => event === undefined || event === null || event === 1);

/** Rows that both have are no change; the others go together in the order of what they say. */
const pourChanges = (earlier: readonly FieldValues[], view: LineView): readonly Change[] => {
  const kept = new Map<string, number>();
  for (const { source } of view.pours) {
    const key = canonical(source.values);
    kept.set(key, (kept.get(key) ?? 0) + 1);
  }
  const gone = firstPours(earlier).filter((values) => {
    const key = canonical(values);
    const left = kept.get(key) ?? 0;
    if (left > 0) kept.set(key, left - 1);
    return left === 0;
  });
  const fresh = view.pours.filter(({ event, source }) => {
    const key = canonical(source.values);
    const left = kept.get(key) ?? 0;
    if (left > 0) kept.set(key, left - 1);
    return event === 1 && left > 0;
  });
  const order = (a: FieldValues, b: FieldValues) => byText(canonical(a), canonical(b));
  const rows = fresh.toSorted((a, b) => order(a.source.values, b.source.values));
  const before = gone.toSorted(order);
  const paired = before.flatMap((values, n) => {
    const row = rows[n];
    return row ? changesIn('pour', { before: values, after: row.source.values, source: row.source }) : [];
  });
  const quantity = RECORD_FIELDS.pour.get('quantity')?.title ?? 'quantity';
  const added = rows.slice(before.length).map(({ source }) => ({
    field: 'quantity',
    title: quantity,
    before: 0,
    after: source.values['quantity'] ?? null,
    source,
  }));
  return [...paired, ...added];
};

/**
 * One draft for each rule that is met now (`titles` by code) and was not at an earlier check, where a measured value was
 * changed in between: the finding's own field where that was changed, else the first that was.
 */
export const changedToPass = ({
  view,
  earlier,
  titles,
}: {
  readonly view: LineView;
  readonly earlier: readonly EarlierFailure[];
  readonly titles: ReadonlyMap<string, string>;
}): readonly FindingDraft[] => {
  const told = new Set<string>();
  return earlier.flatMap((failure): FindingDraft[] => {
    const rule = titles.get(failure.code);
    if (rule === undefined || NOT_MEASURED.test(failure.code) || told.has(failure.code)) return [];
    const changes = [
      ...changesIn(view.kind, { before: failure.values, after: view.values, source: view.source }),
      ...pourChanges(failure.pours, view),
    ].filter(({ field }) => !view.broken.has(field));
    const change = changes.find(({ field }) => field === failure.field) ?? changes[0];
    if (!change) return [];
    told.add(failure.code);
    const { field, title, before, after, source } = change;
    return [
      {
        field,
        source,
        part: failure.code,
        measured: typeof after === 'boolean' ? String(after) : after,
        limit: null,
        margin: null,
        unit: null,
        params: {
          rule: failure.code,
          ruleTitle: rule,
          title,
          before,
          changed: changes.length,
          earlierMeasured: failure.measured,
          earlierLimit: failure.limit,
          earlierUnit: failure.unit,
        },
      },
    ];
  });
};
