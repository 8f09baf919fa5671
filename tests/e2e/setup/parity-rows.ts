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

function picked(one: Given, keys: readonly string[]): Readonly<Record<string, unknown>> {
  const known = new Map<string, unknown>(Object.entries(one));
  // As JSON has it: what is absent and what is undefined are one.
  return JSON.parse(
    JSON.stringify(Object.fromEntries(keys.map((key) => [key, known.get(key) ?? null]))),
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
