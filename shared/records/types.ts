/** What passes between the pure steps: workbook rows -> source records -> checked records. */

export const KINDS = ['set', 'straighten', 'relevel'] as const;
export type Kind = (typeof KINDS)[number];

/** Sheet of the workbook that carries each kind. */
export const SHEET_OF_KIND: Readonly<Record<Kind, string>> = {
  set: 'Set',
  straighten: 'Straighten',
  relevel: 'Re-level',
};

export type Scalar = string | number | boolean | null;

/** Normalised values by field key: numbers in the unit of the field's name, codes, wall-clock `YYYY-MM-DDTHH:mm`, or a word-code (`not-by-us`, `not-yet`, `not-measured`). Blank fields are absent. */
export type FieldValues = Readonly<Record<string, Scalar>>;

/** Where a value was written and what stood there. `address` is like `H9`. */
export type CellSource = { readonly address: string; readonly raw: string };

/** Why a cell could not be read, as code + parameters; wording is rendered in shared/findings. */
export type CellProblem = {
  readonly field: string;
  readonly address: string | null;
  readonly raw: string | null;
  /** `record-unreadable`, `record-unit`, `record-missing`, `record-range`, `record-code`, `record-formula`, … */
  readonly code: string;
  readonly params: Readonly<Record<string, Scalar>>;
};

/** One row of a sheet after its cells were read; nothing is judged yet. */
export type SourceRow = {
  readonly sheet: string;
  /** 1-based row of the sheet. */
  readonly row: number;
  readonly values: FieldValues;
  readonly cells: Readonly<Record<string, CellSource>>;
  readonly problems: readonly CellProblem[];
};

export type SourceLine = SourceRow & { readonly kind: Kind; readonly structureNumber: string };

/** A workbook after its cells were read: what the check begins with. */
export type SourceBatch = {
  readonly batch: SourceRow;
  readonly lines: readonly SourceLine[];
  readonly pours: readonly SourceRow[];
  readonly events: readonly SourceRow[];
  readonly photos: readonly SourceRow[];
  /** Workbook-level problems: unknown sheets, unknown columns (notes), template version, missing key columns. */
  readonly notices: readonly WorkbookNotice[];
  readonly templateVersion: string | null;
  /** Column letters by sheet, then field: where a blank field would stand. */
  readonly columns?: Readonly<Record<string, Readonly<Record<string, string>>>>;
};

export type WorkbookNotice = {
  readonly code: string;
  readonly severity: 'nonconformity' | 'query' | 'note';
  readonly sheet: string | null;
  readonly address: string | null;
  readonly params: Readonly<Record<string, Scalar>>;
};

/** Derived figures kept with a record. Null: cannot be computed from what is there. */
export type Derived = {
  readonly voidFt3: number | null;
  readonly placedFt3: number | null;
  readonly fillRatio: number | null;
  /** Expanded uncertainty of the fill ratio, k = 2. */
  readonly fillRatioU: number | null;
  readonly dueFt: number | null;
  readonly waterWithPoleIn: number | null;
  readonly leastAnnulusIn: number | null;
  readonly poleTaped: boolean | null;
  /** The reading that contributes most to the uncertainty: "measure this again first". Field key. */
  readonly worstReading: string | null;
};
