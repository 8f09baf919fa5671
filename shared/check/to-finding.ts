import type { Finding, Params, Severity } from '#shared/findings/types.ts';
import type { Scalar, SourceRow } from '#shared/records/types.ts';
import { structureKey } from '#shared/records/structure-key.ts';
import { fingerprint } from '#shared/findings/fingerprint.ts';
import type { CellFinder } from './cell-finder.ts';
import type { PreparedLine } from './prepared.ts';

/** What a finding is made from, wherever it comes from. */
export type Found = {
  readonly code: string;
  readonly severity: Severity;
  readonly line: PreparedLine | null;
  readonly source: SourceRow;
  readonly field: string | null;
  readonly measured: Scalar | undefined;
  readonly limit: number | string | null;
  readonly margin: number | null;
  readonly unit: string | null;
  readonly uncertainty?: number | null;
  readonly params?: Params;
  readonly ownerParams?: Params;
  readonly part?: string;
};

/** A number that JSON can carry (no minus zero either); null for what is none. */
const finite = (value: number | null | undefined): number | null =>
  typeof value === 'number' && Number.isFinite(value) ? value + 0 : null;

const told = (value: Scalar | undefined): number | string | null => {
  if (typeof value === 'number') return finite(value);
  return value === undefined || value === null ? null : String(value);
};

export const toFinding = (found: Found, cellOf: CellFinder): Finding => {
  const { code, severity, line, source, field, part = '' } = found;
  return {
    code,
    severity,
    kind: line?.kind ?? null,
    structureNumber: line
      ? line.structureNumber
      : (told(source.values['structureNumber'])?.toString() ?? null),
    occurrence: line?.occurrence ?? null,
    sheet: source.sheet,
    row: source.row,
    cell: cellOf(source, field),
    field,
    measured: told(found.measured),
    limit: told(found.limit),
    margin: finite(found.margin),
    unit: found.unit,
    uncertainty: finite(found.uncertainty),
    params: found.params ?? {},
    ownerParams: found.ownerParams ?? {},
    fingerprint: fingerprint([
      code,
      line?.kind ?? source.sheet,
      line && structureKey(line.structureNumber),
      line?.occurrence,
      field,
      part,
    ]),
  };
};
