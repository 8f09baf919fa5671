import type { GeoArea } from '#shared/calc/geo-area.ts';
import type { Derived, FieldValues, Kind, Scalar, SourceRow } from '#shared/records/types.ts';
import type { Finding, Params, Severity } from '#shared/findings/types.ts';
import type { Product, Standard } from '#shared/standard/types.ts';

/** A pour of one kit size and lot, normalised; several rows may share a number. Fields are null where blank or unreadable. */
export type Pour = {
  readonly source: SourceRow;
  readonly pourNumber: number | null;
  readonly event: number;
  /** Wall clock `YYYY-MM-DDTHH:mm`. */
  readonly pouredAt: string | null;
  /** UTC milliseconds of `pouredAt` in the work order's zone; null when unreal or missing. */
  readonly pouredAtMs: number | null;
  readonly product: string | null;
  readonly lot: string | null;
  readonly kitFt3: number | null;
  readonly quantity: number | null;
  readonly wastedQuantity: number;
  readonly componentATempF: number | null;
  readonly componentBTempF: number | null;
  /** Fields of the row with a `record-…` finding. */
  readonly broken: ReadonlySet<string>;
};

export type PhotoFact = {
  readonly id: string;
  readonly fileName: string;
  readonly sha256: string;
  readonly view: string;
  /** What was measured on it; null or absent: not yet, or the picture cannot be read. */
  readonly facts?: PhotoMeasures | null;
};

export type PhotoMeasures = {
  /** Wall clock of the camera, `YYYY-MM-DDTHH:mm:ss`. */
  readonly takenWall: string | null;
  /** UTC milliseconds, where the camera tells its offset. */
  readonly takenAtMs: number | null;
  readonly latitude: number | null;
  readonly longitude: number | null;
  readonly width: number | null;
  readonly height: number | null;
  /** 64-bit perceptual hash as 16 hexadecimal digits. */
  readonly phash: string | null;
};

/** A photograph of another batch that shares its bytes, or nearly its hash, with one of this batch. */
export type OtherPhoto = {
  readonly sha256: string;
  readonly phash: string | null;
  readonly view: string;
  readonly structureNumber: string;
  readonly batch: string;
  /** Handed in by the batch's own contractor. */
  readonly own: boolean;
};

/** A rule that a line did not meet at an earlier check of its revision, with what the line said then. */
export type EarlierFailure = {
  readonly code: string;
  readonly field: string | null;
  readonly measured: number | string | null;
  readonly limit: number | string | null;
  readonly unit: string | null;
  readonly values: FieldValues;
  /** Values of its pour rows as they stood. */
  readonly pours: readonly FieldValues[];
};

export type RegisterFact = { readonly recordNumber: string; readonly own: boolean };

/** What the batch knows beside one line, as plain data prepared once a batch by set-based queries. Null: not known here, so rules that need it are skipped and say so. */
export type CheckContext = {
  readonly zone: string;
  /** UTC milliseconds of hand-in (or of the check, for a draft). */
  readonly asOfMs: number | null;
  /** Published standards, ascending by `effectiveOn` (YYYY-MM-DD). The one in force on the work day is used. */
  readonly standards: readonly StandardInForce[];
  readonly products: readonly ProductInForce[];
  readonly lots: readonly LotFact[] | null;
  readonly lotUse: readonly LotUse[] | null;
  readonly design: readonly DesignFact[] | null;
  /** Structures of the register, and of the batch's lines that stand, near its lines. */
  readonly neighbours: readonly NeighbourFact[] | null;
  /** The work order's area, or that it has none. */
  readonly area: GeoArea | 'none' | null;
  /** Photographs by the key of shared/records/structure-key.ts `lineKey`: `kind|STRUCTURE|occurrence`. */
  readonly photos: ReadonlyMap<string, readonly PhotoFact[]> | null;
  readonly otherPhotos: readonly OtherPhoto[] | null;
  /** Current *set* records of other batches, by structure key. */
  readonly register: ReadonlyMap<string, RegisterFact> | null;
  /** What rules found at earlier checks of this revision, by `lineKey`. */
  readonly previous: ReadonlyMap<string, readonly EarlierFailure[]> | null;
  /** Approved lines of earlier revisions of this batch, by `kindKey`: `kind|STRUCTURE`. */
  readonly siblings: ReadonlySet<string> | null;
  /** Parts of which only the contractor's own is known here: rules that need them run, and what they lack is said. */
  readonly ownOnly?: readonly ContextPart[];
};

export type StandardInForce = {
  readonly id: string;
  readonly n: number;
  readonly effectiveOn: string;
  readonly body: Standard;
};
export type ProductInForce = {
  readonly code: string;
  readonly n: number;
  readonly effectiveOn: string;
  readonly body: Product;
};
export type LotStatus = 'in-use' | 'held' | 'recalled';
export type LotFact = {
  readonly product: string;
  readonly number: string;
  readonly expiresOn: string | null;
  /** Now. */
  readonly status: LotStatus;
  /** What it came to be and on which day, ascending; in use before the first. Absent: not known, `status` has always been so. */
  readonly history?: readonly { readonly on: string; readonly status: LotStatus }[];
};
/** Kits of a lot by size, the lines being checked apart. */
export type LotUse = {
  readonly product: string;
  readonly number: string;
  readonly sizes: readonly {
    readonly kitFt3: number;
    readonly received: number;
    /** By all contractors, wasted kits too. */
    readonly used: number;
    /** Of these, by the batch's contractor. */
    readonly own: number;
  }[];
};
export type DesignFact = {
  readonly structureNumber: string;
  readonly kind: Kind;
  readonly poleLengthFt: number | null;
  readonly poleClass: string | null;
  readonly poleMaterial: string | null;
  readonly embedmentFt: number | null;
  readonly latitude: number | null;
  readonly longitude: number | null;
};

export type NeighbourFact = {
  readonly structureNumber: string;
  readonly latitude: number;
  readonly longitude: number;
  readonly accuracyFt: number;
  /** The batch's own contractor put it there: its name may be told. */
  readonly own: boolean;
};

/** A rework or repair of a line (2, 3 …) as its row of the Events sheet tells it. Event 1 is the line's own row. */
export type LineEvent = {
  readonly event: number;
  readonly source: SourceRow;
  readonly values: FieldValues;
  readonly broken: ReadonlySet<string>;
  readonly instants: ReadonlyMap<string, number>;
};

/** One line with all a rule may look at. */
export type LineView = {
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly occurrence: number;
  readonly source: SourceRow;
  readonly values: FieldValues;
  /** Fields of the line's own row with a `record-…` finding (`pours` when rows that might be its pours could not be linked): what follows from them adds nothing more. */
  readonly broken: ReadonlySet<string>;
  /** By event, then pour number. */
  readonly pours: readonly Pour[];
  /** Ascending by number. */
  readonly events: readonly LineEvent[];
  readonly photos: readonly PhotoFact[] | null;
  readonly derived: Derived;
  readonly workDay: string | null;
  readonly standard: StandardInForce;
  /** Product of the line's first pour whose product is known; null otherwise. */
  readonly product: Product | null;
  /** UTC milliseconds of a wall-clock field; null when blank, a word, unreal or ambiguous. */
  readonly instants: ReadonlyMap<string, number>;
};

/** The part of a finding that a rule says itself; the engine adds code, severity, place and fingerprint. */
export type FindingDraft = {
  readonly field?: string | null;
  /** Where it stands, when not in the line's own row (a pour row). */
  readonly source?: SourceRow;
  readonly measured: number | string | null;
  readonly limit: number | string | null;
  readonly margin: number | null;
  readonly unit: string | null;
  readonly uncertainty?: number | null;
  readonly params?: Params;
  readonly ownerParams?: Params;
  /** Tells two findings of one rule on one line apart. */
  readonly part?: string;
  /** Overrides the rule's severity (a `record-…` note, say). */
  readonly severity?: Severity;
  /** Overrides the rule's code: `unproved` raised by a rule that lacks a value. */
  readonly unproved?: string;
};

export type BatchView = {
  readonly lines: readonly LineView[];
  readonly pours: readonly Pour[];
  /** Pours whose structure has no line here, nor an approved one of an earlier revision. */
  readonly orphans: readonly Pour[];
  readonly batch: SourceRow;
};

/** Parts of the context that may be unknown. */
export type ContextPart =
  | 'asOfMs'
  | 'lots'
  | 'lotUse'
  | 'design'
  | 'neighbours'
  | 'area'
  | 'register'
  | 'photos'
  | 'otherPhotos'
  | 'siblings'
  | 'previous';

type RuleBase = {
  readonly code: string;
  readonly title: string;
  readonly kinds: readonly Kind[];
  readonly severity: Severity;
  /** Field key of the primary cell. */
  readonly field: string;
  /** Parts of the context without which the rule is skipped. */
  readonly needs: readonly ContextPart[];
  /** JSON Schema (2020-12) of the rule's parameters, each with title, unit, default and range. */
  readonly paramsSchema: Readonly<Record<string, unknown>>;
  /** One sentence of what is wrong, from the finding's data alone. */
  readonly message: (finding: Finding) => string;
  /** What would put it right. */
  readonly remedy: (finding: Finding) => string;
};

export type LineRule = RuleBase & {
  readonly scope: 'line';
  readonly check: (
    line: LineView,
    params: Readonly<Record<string, Scalar>>,
    context: CheckContext,
  ) => readonly FindingDraft[];
};

export type BatchRule = RuleBase & {
  readonly scope: 'batch';
  readonly check: (
    batch: BatchView,
    params: Readonly<Record<string, Scalar>>,
    context: CheckContext,
  ) => readonly (FindingDraft & { readonly line?: LineView })[];
};

export type Rule = LineRule | BatchRule;
