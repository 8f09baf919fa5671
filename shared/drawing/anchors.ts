/** Places on the section of a *set* record that a finding or a label can point to. */
export type AnchorName =
  | 'pole-top'
  | 'foam-top'
  | 'foam'
  | 'annulus'
  | 'water'
  | 'bore-top'
  | 'bore-bottom'
  | 'butt'
  | 'bed'
  | 'rock'
  | 'embedment'
  | 'bore-depth';

const FIELDS: Readonly<Record<string, AnchorName>> = {
  embedmentFt: 'embedment',
  boreDepthFt: 'bore-depth',
  boreTopIn: 'bore-top',
  boreTopAcrossIn: 'bore-top',
  boreBottomIn: 'bore-bottom',
  boreBottomAcrossIn: 'bore-bottom',
  bellIn: 'bore-bottom',
  bellHeightFt: 'bore-bottom',
  leastGapIn: 'annulus',
  bedMaterial: 'bed',
  bedFt: 'bed',
  rockFromFt: 'rock',
  ground: 'rock',
  slopeRiseIn: 'bore-top',
  foamTopBelowGradeIn: 'foam-top',
  backfillOnTop: 'foam-top',
  waterIn: 'water',
  waterMeasured: 'water',
  girthButtIn: 'butt',
  diameterButtIn: 'butt',
  buttEnd: 'butt',
  wallIn: 'butt',
  pourNumber: 'foam',
  product: 'foam',
  lot: 'foam',
  kitFt3: 'foam',
  quantity: 'foam',
  wastedQuantity: 'foam',
  componentATempF: 'foam',
  componentBTempF: 'foam',
  pouredAt: 'foam',
};

/** Everything about the pole itself and about the clock of the work on it. */
const POLE = /^(pole|girth|diameter|brand|lean|designRake|structureUse|(bored|set|letGo|hardware|load)At$)/;

/** A rule's primary cell is where its figures begin; what it speaks of may be another thing: the foam, a photograph. */
export function aboutReading(code: string): boolean {
  return !/^(fill|lot|pour|kit|photo|product)-/.test(code);
}

/** Null: it is nowhere on the drawing (a position, a photograph, the order). */
export function anchorOf(field: string | null, code: string): AnchorName | null {
  if (code.startsWith('photo-')) return null;
  if (code.startsWith('annulus-')) return 'annulus';
  if (code.startsWith('fill-') || code.startsWith('lot-') || code.startsWith('pour-')) return 'foam';
  if (field === null) return null;
  return FIELDS[field] ?? (POLE.test(field) ? 'pole-top' : null);
}
