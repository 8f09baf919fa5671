import type { ShownFinding } from '#shared/check/shown-finding.ts';
import { HEADER_ROWS } from '#shared/workbook/layout.ts';
import { inputId, POUR_FIELDS } from './typed-fields.ts';
import { inOrder } from './result-view.ts';
import type { TypedResult } from './use-typed-check.ts';

/** A finding with the input that it is about; null: the line as a whole. */
export type PlacedFinding = { readonly finding: ShownFinding; readonly input: string | null };

const ONLY_IN_POURS = new Set(POUR_FIELDS.map(({ key }) => key));

function inputOf({ sheet, row, field }: ShownFinding, fields: ReadonlySet<string>): string | null {
  if (field === null) return null;
  if (sheet === 'Pours' && row !== null && field !== 'structureNumber')
    return inputId(row - HEADER_ROWS.data, field);
  if (fields.has(field)) return inputId(null, field);
  return ONLY_IN_POURS.has(field) ? inputId(0, field) : null;
}

/** Findings on a typed line and its pours; the sheets that a typed line has none of are left out. */
export function placeFindings(
  result: TypedResult | null,
  fields: ReadonlySet<string>,
): readonly PlacedFinding[] {
  if (result === null) return [];
  const loose = result.loose.filter(({ sheet }) => sheet === 'Pours');
  return inOrder([...(result.line?.findings ?? []), ...loose]).map((finding) => ({
    finding,
    input: inputOf(finding, fields),
  }));
}

/** A blank field: said beside it once it was left, and in the summary as a number. */
export const isBlank = ({ finding }: PlacedFinding): boolean => finding.code === 'record-missing';
