// Written by `npm run generate` from schemas/. Do not edit.

/**
 * A new or replacement pole set in foam, as one row of the Set sheet. Values are normalised; a blank field is absent.
 */
export interface SetRecord {
  /**
   * As on the work order.
   */
  structureNumber: string;
  /**
   * Number of the structure that this pole replaces.
   */
  replacesStructure?: string;
  /**
   * Whole length, butt to top.
   */
  poleLengthFt: number;
  /**
   * H6 to H1, 1 to 7, 9, 10, or other.
   */
  poleClass:
    'H6' | 'H5' | 'H4' | 'H3' | 'H2' | 'H1' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '9' | '10' | 'other';
  /**
   * Species of a wood pole, or steel, concrete, composite.
   */
  poleMaterial:
    | 'southern-pine'
    | 'douglas-fir'
    | 'western-redcedar'
    | 'ponderosa-pine'
    | 'red-pine'
    | 'jack-pine'
    | 'lodgepole-pine'
    | 'northern-white-cedar'
    | 'steel'
    | 'concrete'
    | 'composite';
  /**
   * Round if blank. For a polygon give the size across flats.
   */
  poleSection?: 'round' | 'square' | 'hexagonal' | 'octagonal' | 'dodecagonal';
  /**
   * Solid if blank. A hollow pole: open, plugged or plated.
   */
  buttEnd?: 'solid' | 'open' | 'plugged' | 'plated';
  /**
   * Wall of a hollow pole. Needed for an open butt.
   */
  wallIn?: number;
  /**
   * Taped round the pole at ground line.
   */
  girthGroundLineIn?: number;
  /**
   * Taped round the butt.
   */
  girthButtIn?: number;
  /**
   * If no girth was taped. Polygon: across flats.
   */
  diameterGroundLineIn?: number;
  /**
   * If no girth was taped. Polygon: across flats.
   */
  diameterButtIn?: number;
  /**
   * Maker’s mark above the ground line, on the low side.
   */
  brandHeightFt?: number;
  /**
   * What the pole does in the line.
   */
  structureUse?: 'tangent' | 'angle' | 'dead-end' | 'guyed';
  /**
   * Diameter at grade.
   */
  boreTopIn: number;
  /**
   * At right angles to the first, if out of round.
   */
  boreTopAcrossIn?: number;
  /**
   * As the top if blank. Belled: at the top of the bell.
   */
  boreBottomIn?: number;
  /**
   * At right angles to the first, if out of round.
   */
  boreBottomAcrossIn?: number;
  /**
   * Diameter at the bottom of a belled bore.
   */
  bellIn?: number;
  /**
   * Bottom of the bore to the top of the bell.
   */
  bellHeightFt?: number;
  /**
   * Low-side grade to the bottom of the bore.
   */
  boreDepthFt: number;
  /**
   * Narrowest gap between bore and pole, where the pole stands off centre.
   */
  leastGapIn?: number;
  /**
   * Whether a casing was used, and what became of it.
   */
  casing?: 'none' | 'left-in' | 'pulled';
  /**
   * What the bore was dug in.
   */
  ground: 'soil' | 'rock' | 'soil-over-rock';
  /**
   * Depth at which rock begins. Needed for soil over rock.
   */
  rockFromFt?: number;
  /**
   * Rise of grade across the bore, low side to high side.
   */
  slopeRiseIn?: number;
  /**
   * What lies in the bore below the butt.
   */
  bedMaterial?: 'none' | 'crushed-stone' | 'native';
  /**
   * Height of the bed below the butt. Needs a bed material.
   */
  bedFt?: number;
  /**
   * Ground line on the low side to the butt.
   */
  embedmentFt: number;
  /**
   * 0 at grade; negative where crowned above it.
   */
  foamTopBelowGradeIn: number;
  /**
   * What lies on the foam.
   */
  backfillOnTop?: 'none' | 'native' | 'gravel';
  /**
   * Depth from the bottom of the bore, before a bed is placed. Or: not measured.
   */
  waterIn: number | 'not-measured';
  /**
   * In the open bore if blank, or with the pole in.
   */
  waterMeasured?: 'open-bore' | 'with-pole';
  /**
   * Of the axis: the mean of two opposite faces. Or: not measured.
   */
  leanInPer10Ft: number | 'not-measured';
  /**
   * Degrees from north, towards which the top leans. Needed where the lean is over 0.25.
   */
  leanAzimuthDeg?: number;
  /**
   * Lean called for by the design; 0 if blank.
   */
  designRakeInPer10Ft?: number;
  /**
   * Degrees from north, towards which the top leans. Needed where the rake is over 0.25.
   */
  designRakeAzimuthDeg?: number;
  /**
   * When the bore was finished.
   */
  boredAt: string;
  /**
   * When the pole stood in the bore.
   */
  setAt: string;
  /**
   * When the pole was let go. Or: not yet, not by us.
   */
  letGoAt?: string;
  /**
   * First work on the set pole. Or: not yet, not by us.
   */
  hardwareAt?: string;
  /**
   * When line tension came on the pole. Or: not yet, not by us.
   */
  loadAt?: string;
  /**
   * WGS 84 decimal degrees, north positive.
   */
  latitude: number;
  /**
   * WGS 84 decimal degrees, west negative.
   */
  longitude: number;
  /**
   * As the receiver states it.
   */
  accuracyFt?: number;
  /**
   * Number of the utility-locate ticket.
   */
  locateTicket?: string;
  /**
   * First day of the ticket.
   */
  locateFrom?: string;
  /**
   * Last day of the ticket.
   */
  locateTo?: string;
  /**
   * If not the one on the Batch sheet.
   */
  foreman?: string;
  /**
   * What the columns cannot say.
   */
  notes?: string;
}

/**
 * A leaning pole pulled plumb and its gap filled, as one row of the Straighten sheet. Values are normalised; a blank field is absent.
 */
export interface StraightenRecord {
  /**
   * As on the work order.
   */
  structureNumber: string;
  /**
   * Species of a wood pole, or steel, concrete, composite.
   */
  poleMaterial:
    | 'southern-pine'
    | 'douglas-fir'
    | 'western-redcedar'
    | 'ponderosa-pine'
    | 'red-pine'
    | 'jack-pine'
    | 'lodgepole-pine'
    | 'northern-white-cedar'
    | 'steel'
    | 'concrete'
    | 'composite';
  /**
   * Round if blank. For a polygon give the size across flats.
   */
  poleSection?: 'round' | 'square' | 'hexagonal' | 'octagonal' | 'dodecagonal';
  /**
   * Whole length, butt to top.
   */
  poleLengthFt?: number;
  /**
   * H6 to H1, 1 to 7, 9, 10, or other.
   */
  poleClass?:
    'H6' | 'H5' | 'H4' | 'H3' | 'H2' | 'H1' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '9' | '10' | 'other';
  /**
   * Taped round the pole at ground line.
   */
  girthGroundLineIn?: number;
  /**
   * If no girth was taped. Polygon: across flats.
   */
  diameterGroundLineIn?: number;
  /**
   * Ground line on the low side to the butt, if known.
   */
  embedmentFt?: number;
  /**
   * Where the embedment is known from.
   */
  embedmentSource?: 'record' | 'brand' | 'measured' | 'unknown';
  /**
   * Of the axis, before pulling. Or: not measured.
   */
  leanBeforeInPer10Ft?: number | 'not-measured';
  /**
   * Degrees from north. Needed where the lean is over 0.25.
   */
  leanBeforeAzimuthDeg?: number;
  /**
   * Of the axis, after release. Or: not measured.
   */
  leanAfterInPer10Ft?: number | 'not-measured';
  /**
   * Degrees from north. Needed where the lean is over 0.25.
   */
  leanAfterAzimuthDeg?: number;
  /**
   * Lean called for by the design; 0 if blank.
   */
  designRakeInPer10Ft?: number;
  /**
   * Degrees from north, towards which the top leans. Needed where the rake is over 0.25.
   */
  designRakeAzimuthDeg?: number;
  /**
   * What the pole returned when released. Or: not measured.
   */
  springbackInPer10Ft?: number | 'not-measured';
  /**
   * Width of the gap behind the pole at grade, pole pulled.
   */
  gapAtGradeIn: number;
  /**
   * Width of the gap at the foamed depth; 0 if blank.
   */
  gapAtDepthIn?: number;
  /**
   * Depth to which the gap was foamed.
   */
  gapDepthFt: number;
  /**
   * Across the gap; pole diameter at grade if blank.
   */
  gapWidthIn?: number;
  /**
   * Depth from the bottom of the gap, with the pole in. Or: not measured.
   */
  waterIn: number | 'not-measured';
  /**
   * When the pole stood plumb.
   */
  pulledAt: string;
  /**
   * When the pull was let off.
   */
  releasedAt: string;
  /**
   * First work on the pole after it. Or: not yet, not by us.
   */
  reattachedAt?: string;
  /**
   * WGS 84 decimal degrees, north positive.
   */
  latitude: number;
  /**
   * WGS 84 decimal degrees, west negative.
   */
  longitude: number;
  /**
   * As the receiver states it.
   */
  accuracyFt?: number;
  /**
   * Number of the utility-locate ticket.
   */
  locateTicket?: string;
  /**
   * First day of the ticket.
   */
  locateFrom?: string;
  /**
   * Last day of the ticket.
   */
  locateTo?: string;
  /**
   * If not the one on the Batch sheet.
   */
  foreman?: string;
  /**
   * What the columns cannot say.
   */
  notes?: string;
}

/**
 * A settled pad-mounted enclosure raised and filled under its pad, as one row of the Re-level sheet. Values are normalised; a blank field is absent.
 */
export interface RelevelRecord {
  /**
   * As on the work order.
   */
  structureNumber: string;
  /**
   * Front to back.
   */
  padLengthIn: number;
  /**
   * Left to right.
   */
  padWidthIn: number;
  /**
   * Cable opening, front to back.
   */
  openingLengthIn?: number;
  /**
   * Cable opening, left to right.
   */
  openingWidthIn?: number;
  /**
   * At the final level, seen from above, facing the doors.
   */
  gap1In: number;
  /**
   * At the final level, seen from above, facing the doors.
   */
  gap2In: number;
  /**
   * At the final level, seen from above, facing the doors.
   */
  gap3In: number;
  /**
   * At the final level, seen from above, facing the doors.
   */
  gap4In: number;
  /**
   * Positive: higher at the back.
   */
  slopeBeforeAlongInPerFt: number;
  /**
   * Positive: higher at the right.
   */
  slopeBeforeAcrossInPerFt: number;
  /**
   * Positive: higher at the back.
   */
  slopeAfterAlongInPerFt: number;
  /**
   * Positive: higher at the right.
   */
  slopeAfterAcrossInPerFt: number;
  /**
   * When the pad stood at its final level.
   */
  raisedAt: string;
  /**
   * When it was let down on to the foam.
   */
  loweredAt: string;
  /**
   * When the lifting gear was taken off.
   */
  releasedAt: string;
  /**
   * WGS 84 decimal degrees, north positive.
   */
  latitude: number;
  /**
   * WGS 84 decimal degrees, west negative.
   */
  longitude: number;
  /**
   * As the receiver states it.
   */
  accuracyFt?: number;
  /**
   * Number of the utility-locate ticket.
   */
  locateTicket?: string;
  /**
   * First day of the ticket.
   */
  locateFrom?: string;
  /**
   * Last day of the ticket.
   */
  locateTo?: string;
  /**
   * If not the one on the Batch sheet.
   */
  foreman?: string;
  /**
   * What the columns cannot say.
   */
  notes?: string;
}

/**
 * One kit size and lot of one pour, as one row of the Pours sheet.
 */
export interface PourRecord {
  /**
   * As on the work order.
   */
  structureNumber: string;
  /**
   * Needed only for a structure on two sheets.
   */
  kind?: 'set' | 'straighten' | 'relevel';
  /**
   * 1, 2 … in order. Rows of one pour share number and time.
   */
  pourNumber: number;
  /**
   * 1 as first built (if blank); 2 … rework or repair.
   */
  event?: number;
  /**
   * End of the pour.
   */
  pouredAt: string;
  /**
   * Code on the kit’s label.
   */
  product: string;
  /**
   * Lot number on the kit’s label.
   */
  lot: string;
  /**
   * Nominal yield of one kit.
   */
  kitFt3: number;
  /**
   * Whole kits mixed.
   */
  quantity: number;
  /**
   * Of these, kits that did not go into the void.
   */
  wastedQuantity?: number;
  /**
   * When mixed. Or: not measured.
   */
  componentATempF: number | 'not-measured';
  /**
   * When mixed. Or: not measured.
   */
  componentBTempF: number | 'not-measured';
  /**
   * In the shade.
   */
  airTempF?: number;
  /**
   * What the columns cannot say.
   */
  notes?: string;
}

/**
 * Rework or repair of one structure after it was first built, as one row of the Events sheet.
 */
export interface EventRecord {
  /**
   * As on the work order.
   */
  structureNumber: string;
  /**
   * Needed only for a structure on two sheets.
   */
  kind?: 'set' | 'straighten' | 'relevel';
  /**
   * 2, 3 … in order.
   */
  event: number;
  /**
   * When the work began.
   */
  beganAt: string;
  /**
   * When the pole was let go. Or: not yet, not by us.
   */
  letGoAt?: string;
  /**
   * First work on the pole after it. Or: not yet, not by us.
   */
  hardwareAt?: string;
  /**
   * When line tension came on the pole. Or: not yet, not by us.
   */
  loadAt?: string;
  /**
   * When the pad was let down on to the foam. Or: not yet, not by us.
   */
  loweredAt?: string;
  /**
   * When the pull or lift was taken off. Or: not yet, not by us.
   */
  releasedAt?: string;
  /**
   * As the event left it: 0 at grade; negative where crowned.
   */
  foamTopBelowGradeIn?: number;
  /**
   * As the event left it. Or: not measured.
   */
  leanInPer10Ft?: number | 'not-measured';
  /**
   * Degrees from north. Needed where the lean is over 0.25.
   */
  leanAzimuthDeg?: number;
  /**
   * As found by the event, with the structure in. Or: not measured.
   */
  waterIn?: number | 'not-measured';
  /**
   * What the columns cannot say.
   */
  notes?: string;
}

/**
 * What one photograph shows, as one row of the Photos sheet.
 */
export interface PhotoRecord {
  /**
   * As the file is called, with its ending.
   */
  fileName: string;
  /**
   * As on the work order.
   */
  structureNumber: string;
  /**
   * What the photograph shows.
   */
  view:
    | 'bore-depth'
    | 'water'
    | 'kits'
    | 'finish'
    | 'plumb'
    | 'before'
    | 'gap'
    | 'after'
    | 'level-after'
    | 'brand'
    | 'rework'
    | 'other';
  /**
   * 1 as first built (if blank); 2 … rework or repair.
   */
  event?: number;
  /**
   * What the picture does not say.
   */
  notes?: string;
}

/**
 * The Batch sheet: who hands in what.
 */
export interface BatchSheet {
  /**
   * Number of the work order.
   */
  workOrder: string;
  /**
   * Company that did the work.
   */
  contractor: string;
  /**
   * Who answers for the crew’s readings.
   */
  foreman: string;
  /**
   * Filled in by the template; leave it.
   */
  templateVersion: string;
  /**
   * What concerns the whole batch.
   */
  notes?: string;
}

/**
 * An owner’s construction standard: each rule’s switch, severity and limits, and what the computations take from it. In force from a day that is kept beside it.
 */
export interface Standard {
  /**
   * As the owner calls it.
   */
  name: string;
  /**
   * Every rule the program has, by code.
   */
  rules: {
    'embedment-short': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        toleranceFt: number;
      };
    };
    'embedment-deep': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        allowanceFt: number;
      };
    };
    'brand-differs': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        toleranceFt: number;
        shortPoleBrandFt: number;
        longPoleBrandFt: number;
        shortPoleUpToFt: number;
      };
    };
    'bore-shallow': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        toleranceFt: number;
      };
    };
    'annulus-narrow': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        leastGapIn: number;
      };
    };
    'annulus-wide': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        greatestGapIn: number;
      };
    };
    'fill-short': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        leastRatio: number;
      };
    };
    'fill-excess': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        greatestRatio: number;
      };
    };
    'crown-low': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        deepestBelowGradeIn: number;
      };
    };
    'water-deep': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        limitIn: number;
      };
    };
    'let-go-early': WaitRule;
    'hardware-early': WaitRule;
    'load-early': WaitRule;
    'release-early': WaitRule;
    'lowered-early': WaitRule;
    'lift-early': WaitRule;
    'clock-order': PlainRule;
    'clock-unreal': PlainRule;
    'clock-future': PlainRule;
    'foam-cold': PlainRule;
    'foam-hot': PlainRule;
    'pour-none': PlainRule;
    'pour-orphan': PlainRule;
    'kit-unknown': PlainRule;
    'product-mixed': PlainRule;
    'lot-unknown': PlainRule;
    'lot-expired': PlainRule;
    'lot-held': PlainRule;
    'lot-overdrawn': PlainRule;
    'plumb-out': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        limitInPer10Ft: number;
      };
    };
    'lean-left': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        limitInPer10Ft: number;
      };
    };
    'lean-unproved': PlainRule;
    'gap-shallow': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        leastShare: number;
      };
    };
    'gap-against-lean': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        factor: number;
      };
    };
    'gap-plane': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        limitIn: number;
      };
    };
    'pad-slope': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        limitInPerFt: number;
      };
    };
    'position-off': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        limitFt: number;
      };
    };
    'position-shared': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        leastFt: number;
      };
    };
    'position-outside': PlainRule;
    'not-on-order': PlainRule;
    'done-twice': PlainRule;
    'already-on-record': PlainRule;
    'design-differs': PlainRule;
    'size-differs': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        limitIn: number;
      };
    };
    'locate-missing': PlainRule;
    'locate-lapsed': PlainRule;
    unproved: PlainRule;
    'changed-to-pass': PlainRule;
    'photo-missing': PlainRule;
    'photo-reused': PlainRule;
    'photo-alike': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        greatestBits: number;
      };
    };
    'photo-elsewhen': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        windowMin: number;
      };
    };
    'photo-elsewhere': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        limitFt: number;
      };
    };
    'photo-undated': PlainRule;
    'photo-small': {
      on: boolean;
      severity: 'nonconformity' | 'query' | 'note';
      params: {
        leastEdgePx: number;
      };
    };
  };
  /**
   * By length and ground; the design depth counts where it is larger.
   */
  dueDepth: {
    /**
     * Ascending lengths; a length between two takes the longer.
     *
     * @minItems 1
     */
    table: {
      lengthFt: number;
      soilFt: number;
      rockFt: number;
    }[];
    /**
     * Beyond the table: share of the length …
     */
    beyondShare: number;
    /**
     * … and this.
     */
    beyondPlusFt: number;
    /**
     * … and not less than this.
     */
    beyondLeastFt: number;
    /**
     * Beyond the table, rock: the soil depth less this.
     */
    beyondRockLessFt: number;
    /**
     * A bore in rock this wide everywhere takes the soil column.
     */
    wideBoreIn: number;
    /**
     * Soil over rock: rock no deeper than this shortens the depth due.
     */
    shallowRockFt: number;
    /**
     * shallow-rock: rock column plus soil over it, up to the shallow-rock depth. by-share: between the columns by the share of the soil depth that is soil.
     */
    overRock: 'shallow-rock' | 'by-share';
  };
  /**
   * Standard uncertainties of the readings (k = 1).
   */
  uncertainty: {
    /**
     * All bore diameters together.
     */
    boreIn: number;
    /**
     * All pole sizes together, as diameters.
     */
    poleTapedIn: number;
    /**
     * All pole sizes together, as diameters.
     */
    poleTableIn: number;
    /**
     * Bore depth and embedment together; the foamed depth of a gap.
     */
    depthIn: number;
    /**
     * All gaps together.
     */
    gapIn: number;
    /**
     * Share of the placed volume.
     */
    placedShare: number;
  };
  /**
   * How kits are planned.
   */
  kits: {
    /**
     * Added to the void.
     */
    allowanceShare: number;
    /**
     * A set of kits may exceed the need by this …
     */
    surplusFt3: number;
    /**
     * … or by this share of the need, whichever is more.
     */
    surplusShare: number;
    /**
     * Share added to the order list of a work order.
     */
    spareShare: number;
  };
  /**
   * On sloping grade the foam’s top follows it; otherwise it is level at the low side.
   */
  foamFollowsGrade: boolean;
  /**
   * Share of a crushed-stone bed open to water.
   */
  bedPorosity: number;
  /**
   * Photographs wanted for each kind. The view water is wanted where any is recorded, brand where its rule is on.
   */
  requiredViews: {
    set: (
      | 'bore-depth'
      | 'water'
      | 'kits'
      | 'finish'
      | 'plumb'
      | 'before'
      | 'gap'
      | 'after'
      | 'level-after'
      | 'brand'
      | 'rework'
      | 'other'
    )[];
    straighten: (
      | 'bore-depth'
      | 'water'
      | 'kits'
      | 'finish'
      | 'plumb'
      | 'before'
      | 'gap'
      | 'after'
      | 'level-after'
      | 'brand'
      | 'rework'
      | 'other'
    )[];
    relevel: (
      | 'bore-depth'
      | 'water'
      | 'kits'
      | 'finish'
      | 'plumb'
      | 'before'
      | 'gap'
      | 'after'
      | 'level-after'
      | 'brand'
      | 'rework'
      | 'other'
    )[];
  };
}
export interface WaitRule {
  on: boolean;
  severity: 'nonconformity' | 'query' | 'note';
  params: {
    waitMin: number;
  };
}
export interface PlainRule {
  on: boolean;
  severity: 'nonconformity' | 'query' | 'note';
  params: {};
}

/**
 * A two-part foam as its maker states it.
 */
export interface Product {
  /**
   * As printed on the kit.
   */
  code: string;
  /**
   * As people call it.
   */
  name: string;
  /**
   * Nominal yields of the kits sold.
   *
   * @minItems 1
   */
  kitsFt3: number[];
  /**
   * Risen volume over liquid volume.
   */
  expansionRatio: number;
  /**
   * Component temperatures outside which the product must not be mixed.
   */
  allowedF: {
    lowF: number;
    highF: number;
  };
  /**
   * Component temperatures with the nominal yield.
   */
  fullYieldF: {
    lowF: number;
    highF: number;
  };
  /**
   * By the colder component; straight lines between points, the nearest point outside.
   *
   * @minItems 1
   */
  yieldFactors: {
    tempF: number;
    factor: number;
  }[];
  /**
   * What every wait is multiplied by; straight lines between points, the nearest point outside.
   *
   * @minItems 1
   */
  waitFactors: {
    tempF: number;
    factor: number;
  }[];
  /**
   * Share of full strength since the pour, ascending; straight lines on a logarithmic time axis.
   *
   * @minItems 1
   */
  strength: {
    minutes: number;
    share: number;
  }[];
}
