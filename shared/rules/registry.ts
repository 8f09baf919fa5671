import { alreadyOnRecord } from './already-on-record/rule.ts';
import { annulusNarrow } from './annulus-narrow/rule.ts';
import { annulusWide } from './annulus-wide/rule.ts';
import { boreShallow } from './bore-shallow/rule.ts';
import { brandDiffers } from './brand-differs/rule.ts';
import { changedToPass } from './changed-to-pass/rule.ts';
import { clockFuture } from './clock-future/rule.ts';
import { clockOrder } from './clock-order/rule.ts';
import { clockUnreal } from './clock-unreal/rule.ts';
import { crownLow } from './crown-low/rule.ts';
import { designDiffers } from './design-differs/rule.ts';
import { doneTwice } from './done-twice/rule.ts';
import { embedmentDeep } from './embedment-deep/rule.ts';
import { embedmentShort } from './embedment-short/rule.ts';
import { fillExcess } from './fill-excess/rule.ts';
import { fillShort } from './fill-short/rule.ts';
import { foamCold } from './foam-cold/rule.ts';
import { foamHot } from './foam-hot/rule.ts';
import { gapAgainstLean } from './gap-against-lean/rule.ts';
import { gapPlane } from './gap-plane/rule.ts';
import { gapShallow } from './gap-shallow/rule.ts';
import { hardwareEarly } from './hardware-early/rule.ts';
import { kitUnknown } from './kit-unknown/rule.ts';
import { leanLeft } from './lean-left/rule.ts';
import { leanUnproved } from './lean-unproved/rule.ts';
import { letGoEarly } from './let-go-early/rule.ts';
import { liftEarly } from './lift-early/rule.ts';
import { loadEarly } from './load-early/rule.ts';
import { locateLapsed } from './locate-lapsed/rule.ts';
import { locateMissing } from './locate-missing/rule.ts';
import { lotExpired } from './lot-expired/rule.ts';
import { lotHeld } from './lot-held/rule.ts';
import { lotOverdrawn } from './lot-overdrawn/rule.ts';
import { lotUnknown } from './lot-unknown/rule.ts';
import { loweredEarly } from './lowered-early/rule.ts';
import { notOnOrder } from './not-on-order/rule.ts';
import { padSlope } from './pad-slope/rule.ts';
import { photoAlike } from './photo-alike/rule.ts';
import { photoElsewhen } from './photo-elsewhen/rule.ts';
import { photoElsewhere } from './photo-elsewhere/rule.ts';
import { photoMissing } from './photo-missing/rule.ts';
import { photoReused } from './photo-reused/rule.ts';
import { photoSmall } from './photo-small/rule.ts';
import { photoUndated } from './photo-undated/rule.ts';
import { plumbOut } from './plumb-out/rule.ts';
import { positionOff } from './position-off/rule.ts';
import { positionOutside } from './position-outside/rule.ts';
import { positionShared } from './position-shared/rule.ts';
import { pourNone } from './pour-none/rule.ts';
import { pourOrphan } from './pour-orphan/rule.ts';
import { productMixed } from './product-mixed/rule.ts';
import { releaseEarly } from './release-early/rule.ts';
import { sizeDiffers } from './size-differs/rule.ts';
import type { Rule } from './types.ts';
import { unprovedRule } from './unproved/rule.ts';
import { waterDeep } from './water-deep/rule.ts';

/** Every rule that the program has; a standard switches and sets them. In the order of the trade's table. */
export const RULES: readonly Rule[] = [
  embedmentShort,
  embedmentDeep,
  brandDiffers,
  boreShallow,
  annulusNarrow,
  annulusWide,
  fillShort,
  fillExcess,
  crownLow,
  waterDeep,
  letGoEarly,
  hardwareEarly,
  loadEarly,
  releaseEarly,
  loweredEarly,
  liftEarly,
  clockOrder,
  clockUnreal,
  clockFuture,
  foamCold,
  foamHot,
  pourNone,
  pourOrphan,
  kitUnknown,
  productMixed,
  lotUnknown,
  lotExpired,
  lotHeld,
  lotOverdrawn,
  plumbOut,
  leanLeft,
  leanUnproved,
  gapShallow,
  gapAgainstLean,
  gapPlane,
  padSlope,
  positionOff,
  positionShared,
  positionOutside,
  notOnOrder,
  doneTwice,
  alreadyOnRecord,
  designDiffers,
  sizeDiffers,
  locateMissing,
  locateLapsed,
  unprovedRule,
  changedToPass,
  photoMissing,
  photoReused,
  photoAlike,
  photoElsewhen,
  photoElsewhere,
  photoUndated,
  photoSmall,
];
