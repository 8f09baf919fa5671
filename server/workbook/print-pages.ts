/** What a landscape page holds in print that can still be read, in widths of a figure: about two thirds of full size. */
const PAGE_WIDTH = 190;

/** How many pages side by side a sheet of these column widths (in widths of a figure) is printed on. */
export function pagesAcross(widths: readonly number[]): number {
  const total = widths.reduce((sum, width) => sum + width, 0);
  return Math.max(1, Math.ceil(total / PAGE_WIDTH));
}
