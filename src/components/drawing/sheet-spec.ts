/** Places of the sheet's parts, in the units of its view box (one unit is one pixel on a sheet of that width). */
export type SheetSpec = {
  readonly width: number;
  readonly height: number;
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
  /** Lower right corner and width of the title block. */
  readonly title: { readonly right: number; readonly bottom: number; readonly width: number };
  readonly scaleBar: { readonly x: number; readonly y: number };
  readonly stamp: { readonly x: number; readonly y: number };
};

export const FONT = 13;
export const LINE = 16.5;
export const BALLOON_R = 12.5;

export const WIDE: SheetSpec = {
  width: 760,
  height: 770,
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
  title: { right: 746, bottom: 748, width: 332 },
  scaleBar: { x: 36, y: 720 },
  stamp: { x: 150, y: 700 },
};

/** For a telephone: the title block under the section, labels broken into short lines. */
export const NARROW: SheetSpec = {
  width: 400,
  height: 800,
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
  title: { right: 388, bottom: 788, width: 376 },
  scaleBar: { x: 28, y: 566 },
  stamp: { x: 216, y: 584 },
};
