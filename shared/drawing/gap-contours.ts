import type { Gaps } from '#shared/calc/relevel-void.ts';

/** Shares of the pad: u from left to right, v from front to back. */
export type PlanPoint = { readonly u: number; readonly v: number };
export type Contour = { readonly levelIn: number; readonly points: readonly PlanPoint[] };

const STEPS_IN = [0.25, 0.5, 1, 2, 4, 8, 16] as const;
const MOST = 6;
const SAMPLES = 32;

/** The gap at a place of the pad, between its corners: front left, back left, back right, front right. */
export function gapAt([frontLeft, backLeft, backRight, frontRight]: Gaps, { u, v }: PlanPoint): number {
  const left = frontLeft + (backLeft - frontLeft) * v;
  const right = frontRight + (backRight - frontRight) * v;
  return left + (right - left) * u;
}

/** Step between contours, inches: the finest of which no more than six fit. Null: the gaps are all but equal. */
export function contourStepIn(gaps: Gaps): number | null {
  const range = Math.max(...gaps) - Math.min(...gaps);
  if (range < 0.125) return null;
  return STEPS_IN.find((step) => range / step <= MOST) ?? STEPS_IN[STEPS_IN.length - 1] ?? null;
}

/** Lines of equal gap under the pad, by the surface that runs straight between its corners along every edge. */
export function gapContours(gaps: Gaps): Contour[] {
  const step = contourStepIn(gaps);
  if (step === null) return [];
  const contours: Contour[] = [];
  const lowest = Math.min(...gaps);
  const highest = Math.max(...gaps);
  for (let levelIn = Math.ceil(lowest / step) * step; levelIn <= highest; levelIn += step) {
    if (levelIn <= lowest + 1e-9 || levelIn >= highest - 1e-9 || contours.length > 4 * MOST) continue;
    for (const points of trace(gaps, levelIn)) contours.push({ levelIn, points });
  }
  return contours;
}

/** Sampled along the way in which the surface changes less, so that each sample has at most one place on the line. */
function trace(gaps: Gaps, levelIn: number): PlanPoint[][] {
  const [frontLeft, backLeft, backRight, frontRight] = gaps;
  const alongV = Math.abs(backLeft - frontLeft) + Math.abs(backRight - frontRight);
  const alongU = Math.abs(frontRight - frontLeft) + Math.abs(backRight - backLeft);
  const solveV = alongV >= alongU;
  const lines: PlanPoint[][] = [];
  let line: PlanPoint[] = [];
  for (let index = 0; index <= SAMPLES; index += 1) {
    const free = index / SAMPLES;
    const place = (bound: number) => (solveV ? { u: free, v: bound } : { u: bound, v: free });
    const from = gapAt(gaps, place(0));
    const to = gapAt(gaps, place(1));
    const bound = from === to ? Number.NaN : (levelIn - from) / (to - from);
    if (bound >= 0 && bound <= 1) line.push(place(bound));
    else if (line.length > 0) {
      lines.push(line);
      line = [];
    }
  }
  if (line.length > 0) lines.push(line);
  return lines.filter((one) => one.length > 1);
}
