import { clockOf } from '#shared/check/instants.ts';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import type { Derived, FieldValues, Kind, SourceRow } from '#shared/records/types.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { clockFields } from './clock-chain.ts';
import type { LineEvent, LineView, OtherPhoto, PhotoFact, PhotoMeasures, Pour } from './types.ts';

/** Builds what a rule looks at from the few values that its test is about. Times are of America/Chicago. */

const CLOCK = clockOf(DEMO_CONTEXT.zone);
const SHEET = { set: 'Set', straighten: 'Straighten', relevel: 'Re-level' } as const;

const NOTHING: Derived = {
  voidFt3: null,
  placedFt3: null,
  fillRatio: null,
  fillRatioU: null,
  dueFt: null,
  waterWithPoleIn: null,
  leastAnnulusIn: null,
  poleTaped: null,
  worstReading: null,
};

const NOT_TOLD: PhotoMeasures = {
  takenWall: null,
  takenAtMs: null,
  latitude: null,
  longitude: null,
  width: null,
  height: null,
  phash: null,
};

export const sourceRow = (sheet: string, row: number, values: FieldValues): SourceRow => ({
  sheet,
  row,
  values,
  cells: {},
  problems: [],
});

/** A pour of one 8 ft³ kit at 72 °F, pour 1 of event 1, unless told otherwise. */
export const pourOf = (values: FieldValues = {}, broken: readonly string[] = []): Pour => {
  const all: FieldValues = { structureNumber: 'S-1', ...values };
  const read = <T>(field: string, fallback: T): T => (field in values ? (values[field] as T) : fallback);
  const pouredAt = read<string | null>('pouredAt', '2026-04-14T10:00');
  return {
    source: sourceRow('Pours', 4, all),
    pourNumber: read<number | null>('pourNumber', 1),
    event: read('event', 1),
    pouredAt,
    pouredAtMs: CLOCK.at(pouredAt),
    product: read<string | null>('product', 'EP-15'),
    lot: read<string | null>('lot', 'L-100'),
    kitFt3: read<number | null>('kitFt3', 8),
    quantity: read<number | null>('quantity', 1),
    wastedQuantity: read('wastedQuantity', 0),
    componentATempF: read<number | null>('componentATempF', 72),
    componentBTempF: read<number | null>('componentBTempF', 72),
    broken: new Set(broken),
  };
};

export const eventOf = (kind: Kind, event: number, values: FieldValues): LineEvent => ({
  event,
  source: sourceRow('Events', 4, { structureNumber: 'S-1', event, ...values }),
  values,
  broken: new Set(),
  instants: CLOCK.instants(values, clockFields(kind, event)),
});

/** A photograph of a view; with `facts` (null: not measured yet) what they say and nothing else. */
export const photoOf = (view: string, facts: Partial<PhotoMeasures> | null = null): PhotoFact => ({
  id: view,
  fileName: `${view}.jpg`,
  sha256: view.padEnd(64, '0'),
  view,
  facts: facts && { ...NOT_TOLD, ...facts },
});

/** The same photograph in batch B-9. */
export const otherPhotoOf = (
  { sha256, view }: PhotoFact,
  other: Pick<OtherPhoto, 'structureNumber' | 'own'> & { readonly phash?: string | null },
): OtherPhoto => ({ sha256, view, batch: 'B-9', phash: null, ...other });

export type PartialLine = {
  readonly kind?: Kind;
  readonly structureNumber?: string;
  readonly occurrence?: number;
  readonly values?: FieldValues;
  readonly derived?: Partial<Derived>;
  readonly broken?: readonly string[];
  readonly pours?: readonly Pour[];
  readonly events?: readonly LineEvent[];
  readonly photos?: readonly PhotoFact[] | null;
};

/** A line whose every figure is unknown but what the test gives. */
export const lineOf = ({
  kind = 'set',
  structureNumber = 'S-1',
  occurrence = 1,
  values = {},
  derived = {},
  broken = [],
  pours = [],
  events = [],
  photos = null,
}: PartialLine): LineView => ({
  kind,
  structureNumber,
  occurrence,
  source: sourceRow(SHEET[kind], 4, values),
  values,
  broken: new Set(broken),
  pours,
  events,
  photos,
  derived: { ...NOTHING, ...derived },
  workDay: '2026-04-14',
  standard: { id: 'demo', n: 1, effectiveOn: '1900-01-01', body: DEMO_STANDARD },
  product: DEMO_PRODUCT,
  instants: CLOCK.instants(values, clockFields(kind, 1)),
});
