import type { CreateWorkOrderBody } from '#shared/generated/api-types.ts';

type Structure = CreateWorkOrderBody['structures'][number];
type Kind = Structure['kind'];
export type DesignFault = { readonly row: number; readonly text: string };
export type DesignList = {
  readonly structures: readonly Structure[];
  readonly faults: readonly DesignFault[];
};

/** What the columns are, left to right. */
export const DESIGN_COLUMNS = [
  'structure',
  'kind (set, straighten, relevel)',
  'pole length, ft',
  'class',
  'material',
  'ground',
  'embedment, ft',
  'latitude',
  'longitude',
] as const;

const KINDS: Readonly<Record<string, Kind>> = {
  '': 'set',
  set: 'set',
  straighten: 'straighten',
  relevel: 'relevel',
  're-level': 'relevel',
};
const NUMBERS = [
  { name: 'poleLengthFt', column: 2, least: 1, most: 200 },
  { name: 'embedmentFt', column: 6, least: 0, most: 60 },
  { name: 'latitude', column: 7, least: -90, most: 90 },
  { name: 'longitude', column: 8, least: -180, most: 180 },
] as const;
const TEXTS = [
  { name: 'poleClass', column: 3 },
  { name: 'poleMaterial', column: 4 },
  { name: 'ground', column: 5 },
] as const;

/**
 * Rows pasted from a sheet (tabs) or typed (commas or semicolons). A row whose first word is "structure" is the head.
 * A value that cannot be read is a fault, never a number.
 */
export function parseDesignList(text: string): DesignList {
  const structures: Structure[] = [];
  const faults: DesignFault[] = [];
  const seen = new Map<string, number>();
  text.split(/\r?\n/).forEach((line, index) => {
    const row = index + 1;
    const fields = line.split(line.includes('\t') ? '\t' : /[,;]/).map((field) => field.trim());
    const [structureNumber = '', kindWord = ''] = fields;
    if (fields.every((field) => field === '') || /^structure/i.test(structureNumber)) return;
    const fault = (what: string) => void faults.push({ row, text: `Row ${row}: ${what}` });
    const kind = KINDS[kindWord.toLowerCase()];
    if (structureNumber === '') return fault('the structure number is missing.');
    if (!kind) return fault(`“${kindWord}” is no kind of work; write set, straighten or relevel.`);
    const key = `${kind} ${structureNumber.toUpperCase()}`;
    if (seen.has(key)) return fault(`${structureNumber} stands in row ${seen.get(key)} already.`);
    seen.set(key, row);
    const design: Record<string, string | number | null> = {};
    for (const { name, column, least, most } of NUMBERS) {
      const written = fields[column] ?? '';
      if (written === '') continue;
      const value = /^[-+−]?\d+(\.\d+)?$/.test(written) ? Number(written.replace('−', '-')) : Number.NaN;
      if (value >= least && value <= most) design[name] = value;
      else fault(`“${written}” for ${DESIGN_COLUMNS[column]} is no number from ${least} to ${most}.`);
    }
    for (const { name, column } of TEXTS) if (fields[column]) design[name] = fields[column];
    structures.push({ structureNumber, kind, design });
  });
  return { structures, faults };
}
