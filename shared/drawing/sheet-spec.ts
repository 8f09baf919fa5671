/** Places of the sheet's parts, in the units of its view box (one unit is one pixel on a sheet of that width). */
export type SheetSpec = {
  readonly width: number;
  readonly axisX: number;
  readonly poleTopY: number;
  readonly groundY: number;
  /** Lowest place of the deepest thing drawn. */
  readonly bottomY: number;
  readonly hatch: { readonly left: number; readonly right: number };
  /** Greatest half width of bore or pole. */
  readonly halfRoom: number;
  readonly maxScale: number;
  /** Place of a depth at the left; two stand this step to either side of it. */
  readonly dimensionX: number;
  readonly dimensionStep: number;
  /** Short words, those of the lower dimensions at the right. */
  readonly compact: boolean;
  readonly labels: {
    readonly x: number;
    readonly width: number;
    readonly top: number;
    readonly bottom: number;
    readonly mostLines: number;
  };
  /** Right edge and width of the title block. */
  readonly title: { readonly right: number; readonly width: number };
  readonly scaleBar: { readonly x: number; readonly y: number };
};

export const FONT = 13;
export const LINE = 16.5;
export const BALLOON_R = 12.5;
/** Height that a small plan beside the section takes up. */
export const INSET = 104;

export const WIDE: SheetSpec = {
  width: 760,
  axisX: 256,
  poleTopY: 70,
  groundY: 156,
  bottomY: 566,
  hatch: { left: 106, right: 408 },
  halfRoom: 104,
  maxScale: 70,
  dimensionX: 48,
  dimensionStep: 17,
  compact: false,
  labels: { x: 500, width: 242, top: 26, bottom: 572, mostLines: 3 },
  title: { right: 746, width: 332 },
  scaleBar: { x: 36, y: 720 },
};

/** For a telephone: the title block under the section, labels broken into short lines. */
export const NARROW: SheetSpec = {
  width: 400,
  axisX: 148,
  poleTopY: 60,
  groundY: 130,
  bottomY: 476,
  hatch: { left: 82, right: 216 },
  halfRoom: 44,
  maxScale: 62,
  dimensionX: 38,
  dimensionStep: 17,
  compact: true,
  labels: { x: 262, width: 132, top: 20, bottom: 512, mostLines: 3 },
  title: { right: 388, width: 376 },
  scaleBar: { x: 28, y: 566 },
};

/** Where the parts at the foot of a sheet stand; they depend on how much there is of them. */
export type SheetFoot = {
  readonly height: number;
  readonly titleBottom: number;
  readonly titleTop: number;
  /** Lowest place of the column of labels. */
  readonly labelsBottom: number;
  /** Upper left corner. */
  readonly inset: { readonly x: number; readonly y: number };
  readonly stamp: { readonly x: number; readonly y: number };
  readonly scaleBar: { readonly x: number; readonly y: number };
};

type Parts = {
  /** Height of the title block; 0 without one. */
  readonly titleHeight: number;
  readonly inset: boolean;
  readonly stamp: boolean;
};

const EDGE = 12;

/** Wide: beside and above the title block, on a sheet of one height. Narrow: one under the other. */
export function sheetFoot(spec: SheetSpec, { titleHeight, inset, stamp }: Parts): SheetFoot {
  if (!spec.compact) {
    const height = titleHeight === 0 ? 710 : 770;
    const titleBottom = height - 22;
    const titleTop = titleBottom - titleHeight;
    const room = Math.min(spec.labels.bottom + 60, titleTop - 16);
    return {
      height,
      titleBottom,
      titleTop,
      labelsBottom: inset ? room - INSET - 14 : Math.min(spec.labels.bottom, room),
      inset: { x: spec.labels.x, y: room - INSET },
      stamp: { x: 150, y: height - 70 },
      scaleBar: { x: spec.scaleBar.x, y: height - 50 },
    };
  }
  const insetY = 606;
  const stampY = insetY + (inset ? INSET + 10 : 0);
  const titleTop = stampY + (stamp ? 50 : 4);
  const titleBottom = titleTop + titleHeight;
  return {
    height: titleBottom + EDGE,
    titleBottom,
    titleTop,
    labelsBottom: spec.labels.bottom,
    inset: { x: spec.scaleBar.x, y: insetY },
    stamp: { x: spec.title.right - spec.title.width, y: stampY },
    scaleBar: spec.scaleBar,
  };
}
