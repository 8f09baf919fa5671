import type { Severity } from '#shared/findings/types.ts';
import type { Derived, FieldValues, Kind } from '#shared/records/types.ts';

/** A finding as the sheet shows it; `number` is its balloon and its place in the list beside the sheet. */
export type SheetFinding = {
  readonly id: string;
  readonly number: number;
  readonly code: string;
  /** From the rule: "Embedment short". */
  readonly title: string;
  readonly severity: Severity;
  /** Field key of the primary cell: where the balloon points. */
  readonly field: string | null;
  readonly measured: number | string | null;
  readonly limit: number | string | null;
  readonly margin: number | null;
  readonly unit: string | null;
  readonly uncertainty?: number | null;
  /** Approved or answered: drawn calm. */
  readonly settled?: boolean;
};

/** A row of a pour, as far as the drawing needs it. */
export type SheetPour = {
  readonly pourNumber: number | null;
  readonly event: number | null;
  readonly kitFt3: number | null;
  readonly quantity: number | null;
  readonly wastedQuantity: number | null;
};

export type SheetRecord = {
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly values: FieldValues;
  readonly derived: Derived;
  /** Without them the foam is drawn as one. */
  readonly pours?: readonly SheetPour[];
  /** What rework and repair left, in order; `values` stay as they were found. */
  readonly events?: readonly FieldValues[];
};

export type TitleBlockData = {
  readonly owner: string;
  readonly workOrder: string;
  readonly structure: string;
  /** "Set, soil". */
  readonly kind: string;
  /** "40 ft class 4, southern pine"; null for a pad. */
  readonly pole: string | null;
  /** "14 Apr 2026, 10:42". */
  readonly measuredOn: string;
  readonly standard: string;
  readonly revision: string;
  /** "not yet", or who and when. */
  readonly decided: string;
  /** "6 of 38". */
  readonly sheet: string;
};

/** Stamp of a checked drawing. */
export type SheetStampData = {
  readonly word: string;
  readonly tone: 'conform' | 'nonconform' | 'concession';
  readonly detail?: string;
};

/** Limits of the standard that judged the line, so that they stand beside what was measured even where it conforms. */
export type SheetLimits = {
  readonly annulusLeastIn?: number;
  readonly waterMostIn?: number;
  readonly fillLeast?: number;
  readonly leanMostInPer10Ft?: number;
  readonly slopeMostInPerFt?: number;
};

/** Record: what was built, so that what is lacking is named. Plan: what is meant, so that what only a crew can measure is not. */
export type SheetPurpose = 'record' | 'plan';

export type Tone = 'ink' | 'muted' | 'nonconform' | 'query';

/** A piece of a line of text. */
export type Run = { readonly text: string; readonly bold?: boolean; readonly tone?: Paintable };
type Paintable = Tone | 'conform' | 'concession' | 'ink-2';

export type Point = { readonly x: number; readonly y: number };

export type Box = {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
};

export function toneOf(finding: SheetFinding): Tone {
  if (finding.settled) return 'ink';
  if (finding.severity === 'nonconformity') return 'nonconform';
  return finding.severity === 'query' ? 'query' : 'ink';
}
