import type { ShownFinding } from '#shared/check/shown-finding.ts';
import { HEADER_ROWS } from '#shared/workbook/layout.ts';
import { inputId, POUR_FIELDS } from './typed-fields.ts';
import { inOrder } from './result-view.ts';
import type { TypedResult } from './use-typed-check.ts';
import type { TypedDraft } from './use-typed-draft.ts';

/** A finding with the input that it is about; null: the line as a whole. */
export type PlacedFinding = {
  readonly finding: ShownFinding;
  readonly input: string | null;
  /** Nothing stands there yet: said beside the field once it was left, and in the summary as a number. */
  readonly blank: boolean;
};

const ONLY_IN_POURS = new Set(POUR_FIELDS.map(({ key }) => key));

function inputOf({ sheet, row, field }: ShownFinding, fields: ReadonlySet<string>): string | null {
  if (field === null) return null;
  if (sheet === 'Pours' && row !== null && field !== 'structureNumber')
    return inputId(row - HEADER_ROWS.data, field);
  if (fields.has(field)) return inputId(null, field);
  return ONLY_IN_POURS.has(field) ? inputId(0, field) : null;
}

function isBlankIn(draft: TypedDraft, { sheet, row, field, code }: ShownFinding): boolean {
  if (code === 'record-missing') return true;
  if (field === null) return false;
  const inPour = sheet === 'Pours' && row !== null && field !== 'structureNumber';
  const values = inPour ? draft.pours[row - HEADER_ROWS.data] : draft.values;
  return (values?.[field] ?? '').trim() === '';
}

/**
 * Findings on a typed line and its pours; the sheets that a typed line has none of are left out. Its pours are its
 * own: while no more than its number is typed it is no line yet, and a pour without a line would be said in vain.
 */
export function placeFindings(
  result: TypedResult,
  typed: { readonly draft: TypedDraft; readonly fields: ReadonlySet<string> },
): readonly PlacedFinding[] {
  const loose = result.loose.filter(({ sheet, code }) => sheet === 'Pours' && code !== 'pour-orphan');
  return inOrder([...(result.line?.findings ?? []), ...loose]).map((finding) => {
    const input = inputOf(finding, typed.fields);
    return { finding, input, blank: input !== null && isBlankIn(typed.draft, finding) };
  });
}
