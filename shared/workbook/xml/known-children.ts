/**
 * What may stand directly in the elements that cells are made of (ECMA-376 Part 1, 18). Anything else there would be
 * skipped in silence and take a value, or the count of the values after it, with it.
 */
const KNOWN: ReadonlyMap<string, ReadonlySet<string>> = new Map(
  Object.entries({
    Types: ['Default', 'Override'],
    Relationships: ['Relationship'],
    sheets: ['sheet'],
    cellXfs: ['xf'],
    sst: ['si'],
    si: ['t', 'r', 'rPh', 'phoneticPr'],
    is: ['t', 'r', 'rPh', 'phoneticPr'],
    r: ['rPr', 't'],
    rPh: ['t'],
    t: [],
    sheetData: ['row'],
    row: ['c'],
    c: ['f', 'v', 'is'],
    f: [],
    v: [],
  }).map(([parent, children]) => [parent, new Set(children)]),
);

/** Whether an element may stand in its parent, as far as it matters to cells. Extensions are taken out before. */
export function isKnownChild(parent: string | undefined, name: string): boolean {
  return parent === undefined || (KNOWN.get(parent)?.has(name) ?? true);
}
