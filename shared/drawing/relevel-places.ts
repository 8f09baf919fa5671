import type { RelevelSection } from './relevel-section.ts';
import type { SheetSpec } from './sheet-spec.ts';

export type RelevelPlaces = {
  /** Units per inch. */
  readonly scale: number;
  readonly left: number;
  readonly right: number;
  /** Plan: back edge above, doors below. */
  readonly backY: number;
  readonly frontY: number;
  /** Section: underside of the pad in its middle and at its edges as it slopes now, and the ground below them. */
  readonly padY: number;
  readonly padLeftY: number;
  readonly padRightY: number;
  readonly deepLeftY: number;
  readonly deepRightY: number;
  /** No room for lines beside the plan: its sizes stand among the labels. */
  readonly compact: boolean;
};

/** Sizes of a pad that was not measured: a sign alone, drawn dashed. */
const SIGN_IN = 48;
/** Thickness of pad and box are not measured either: they are a sign, the wedge under them is to scale. */
export const PAD = 18;
export const BOX = 44;
const MOST_RISE = 24;

export function relevelPlaces(section: RelevelSection, spec: SheetSpec): RelevelPlaces {
  const lengthIn = section.lengthIn ?? SIGN_IN;
  const widthIn = section.widthIn ?? SIGN_IN;
  const [frontLeft = 0, backLeft = 0, backRight = 0, frontRight = 0] = section.gapsIn ?? [];
  const meanLeft = (frontLeft + backLeft) / 2;
  const meanRight = (frontRight + backRight) / 2;
  const room = spec.compact ? 136 : 248;
  const deepest = spec.compact ? 70 : 96;
  const axisX = spec.compact ? 124 : spec.axisX;
  const scale = Math.min(room / Math.max(lengthIn, widthIn), deepest / Math.max(meanLeft, meanRight, 0.1));
  const half = (widthIn / 2) * scale;
  const backY = spec.compact ? 76 : 100;
  const frontY = backY + lengthIn * scale;
  const padY = frontY + (spec.compact ? 66 : 78) + PAD + BOX + 26;
  // Higher at the right is up; a slope that no pad has is cut, so that it stays on the sheet.
  const rise = Math.max(-MOST_RISE, Math.min(MOST_RISE, ((section.slopes.afterAcross ?? 0) / 12) * 2 * half));
  const padLeftY = padY + rise / 2;
  const padRightY = padY - rise / 2;
  return {
    scale,
    left: axisX - half,
    right: axisX + half,
    backY,
    frontY,
    padY,
    padLeftY,
    padRightY,
    deepLeftY: padLeftY + Math.max(0, meanLeft) * scale,
    deepRightY: padRightY + Math.max(0, meanRight) * scale,
    compact: spec.compact,
  };
}
