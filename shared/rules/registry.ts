import { annulusNarrow } from './annulus-narrow/rule.ts';
import { boreShallow } from './bore-shallow/rule.ts';
import { clockOrder } from './clock-order/rule.ts';
import { clockUnreal } from './clock-unreal/rule.ts';
import { crownLow } from './crown-low/rule.ts';
import { doneTwice } from './done-twice/rule.ts';
import { embedmentDeep } from './embedment-deep/rule.ts';
import { embedmentShort } from './embedment-short/rule.ts';
import { fillExcess } from './fill-excess/rule.ts';
import { fillShort } from './fill-short/rule.ts';
import { hardwareEarly } from './hardware-early/rule.ts';
import { kitUnknown } from './kit-unknown/rule.ts';
import { liftEarly } from './lift-early/rule.ts';
import { lotUnknown } from './lot-unknown/rule.ts';
import { notOnOrder } from './not-on-order/rule.ts';
import { photoMissing } from './photo-missing/rule.ts';
import { pourNone } from './pour-none/rule.ts';
import { pourOrphan } from './pour-orphan/rule.ts';
import type { Rule } from './types.ts';
import { unprovedRule } from './unproved/rule.ts';
import { waterDeep } from './water-deep/rule.ts';

/** Every rule that the program has; a standard switches and sets them. In the order of the trade's table. */
export const RULES: readonly Rule[] = [
  embedmentShort,
  embedmentDeep,
  boreShallow,
  annulusNarrow,
  fillShort,
  fillExcess,
  crownLow,
  waterDeep,
  hardwareEarly,
  liftEarly,
  clockOrder,
  clockUnreal,
  pourNone,
  pourOrphan,
  kitUnknown,
  lotUnknown,
  notOnOrder,
  doneTwice,
  unprovedRule,
  photoMissing,
];
