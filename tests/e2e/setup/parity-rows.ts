/** What must be the same wherever a workbook is checked: of a finding, and of a record. */
const FINDING = [
  'code',
  'severity',
  'kind',
  'structureNumber',
  'sheet',
  'row',
  'cell',
  'field',
  'measured',
  'limit',
  'margin',
  'unit',
  'uncertainty',
  'params',
  'title',
  'message',
  'remedy',
] as const;
const RECORD = ['kind', 'structureNumber', 'sheet', 'row', 'values', 'derived'] as const;

type Given = object;

/** Digits of a figure that are compared: engines differ in the last ones of a sine, and Node and Chromium are two. */
const DIGITS = 13;
const rounded = (_key: string, value: unknown): unknown =>
  typeof value === 'number' ? Number(value.toPrecision(DIGITS)) : value;

function picked(one: Given, keys: readonly string[]): Readonly<Record<string, unknown>> {
  const known = new Map<string, unknown>(Object.entries(one));
  // As JSON has it: what is absent and what is undefined are one.
  return JSON.parse(
    JSON.stringify(Object.fromEntries(keys.map((key) => [key, known.get(key) ?? null])), rounded),
  ) as Readonly<Record<string, unknown>>;
}

const sorted = <T>(rows: readonly T[]): T[] =>
  rows.toSorted((a, b) => {
    const [one, other] = [JSON.stringify(a), JSON.stringify(b)];
    return one < other ? -1 : one > other ? 1 : 0;
  });

export const findingRows = (findings: readonly Given[]) =>
  sorted(findings.map((one) => picked(one, FINDING)));
export const recordRows = (records: readonly Given[]) => sorted(records.map((one) => picked(one, RECORD)));
