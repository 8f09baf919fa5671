import { describeRelevel, describeStraighten } from './describe-other.ts';
import { describeSet } from './describe-set.ts';
import { relevelMarks } from './draw-relevel.ts';
import { setMarks } from './draw-set.ts';
import { straightenMarks } from './draw-straighten.ts';
import type { LayoutInput } from './layout-input.ts';
import { needsLeanPlan } from './lean-plan.ts';
import type { Mark } from './marks.ts';
import { relevelLayout } from './relevel-layout.ts';
import { setLayout } from './set-layout.ts';
import { needsPlan } from './set-plan.ts';
import { setSection } from './set-section.ts';
import { NARROW, sheetFoot, WIDE } from './sheet-spec.ts';
import type {
  SheetFinding,
  SheetLimits,
  SheetPurpose,
  SheetRecord,
  SheetStampData,
  TitleBlockData,
} from './sheet-types.ts';
import { stampMarks } from './stamp.ts';
import { straightenLayout } from './straighten-layout.ts';
import { straightenSection } from './straighten-section.ts';
import { titleBlockHeight, titleBlockMarks } from './title-block.ts';

export type SheetInput = {
  readonly record: SheetRecord;
  readonly findings: readonly SheetFinding[];
  readonly limits?: SheetLimits;
  /** Without one the sheet has no corner. */
  readonly titleBlock?: TitleBlockData | null;
  readonly stamp?: SheetStampData | null;
  readonly purpose?: SheetPurpose;
  /** For a telephone. */
  readonly narrow?: boolean;
  readonly metric?: boolean;
};

/** A record sheet as marks in sheet units, the same in sentences, and the findings that found no room on it. */
export type SheetDrawing = {
  readonly width: number;
  readonly height: number;
  readonly marks: readonly Mark[];
  readonly sentences: readonly string[];
  readonly leftOut: readonly SheetFinding[];
};

/** Draws one structure to scale from its own numbers; total: whatever is lacking is drawn as lacking. */
export function drawSheet(sheet: SheetInput): SheetDrawing {
  const { record, findings, limits = {}, titleBlock = null, stamp = null, purpose = 'record' } = sheet;
  const spec = sheet.narrow ? NARROW : WIDE;
  const foot = sheetFoot(spec, {
    titleHeight: titleBlock ? titleBlockHeight(titleBlock, spec.title.width) : 0,
    inset: hasInset(record, purpose),
    stamp: stamp !== null,
  });
  const input = { record, findings, limits, purpose, spec, foot, metric: sheet.metric ?? false };
  const { marks, sentences, leftOut } = contentOf(input);
  return {
    width: spec.width,
    height: foot.height,
    marks: [
      ...marks,
      ...(titleBlock ? titleBlockMarks(titleBlock, { ...spec.title, bottom: foot.titleBottom }) : []),
      ...(stamp ? stampMarks(stamp, foot.stamp) : []),
    ],
    sentences,
    leftOut: leftOut.flatMap((label) => (label.finding ? [label.finding] : [])),
  };
}

function hasInset(record: SheetRecord, purpose: SheetPurpose): boolean {
  if (record.kind === 'straighten') return needsLeanPlan(straightenSection(record.values, record.events));
  return record.kind === 'set' && needsPlan(setSection(record, purpose));
}

type Content = {
  readonly marks: Mark[];
  readonly sentences: string[];
  readonly leftOut: readonly { readonly finding: SheetFinding | null }[];
};

function contentOf(input: LayoutInput): Content {
  const { record, findings, metric } = input;
  if (record.kind === 'straighten') {
    const layout = straightenLayout(input);
    return {
      marks: straightenMarks(layout, input),
      sentences: describeStraighten(layout.section, input),
      leftOut: layout.leftOut,
    };
  }
  if (record.kind === 'relevel') {
    const layout = relevelLayout(input);
    return {
      marks: relevelMarks(layout, input),
      sentences: describeRelevel(layout.section, input),
      leftOut: layout.leftOut,
    };
  }
  const layout = setLayout(input);
  return {
    marks: setMarks(layout, input),
    sentences: describeSet(record, { section: layout.section, findings, purpose: input.purpose, metric }),
    leftOut: layout.leftOut,
  };
}
