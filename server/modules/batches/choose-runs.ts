/** A finished check of a batch, as far as choosing goes. */
export type FinishedRun = {
  readonly id: string;
  readonly input: number;
  /** Number of its revision. */
  readonly n: number;
  /** Digest of the workbook it read; null: the one of the revision before, as it stood. */
  readonly workbook: string | null;
};

/**
 * Which two checks are compared, of those given newest first. Every photograph is checked too, so "the check before"
 * would forget a changed value as soon as one more photograph came in: it is the newest that read another workbook, or
 * belongs to an earlier revision. While there is one workbook only, it is the first check of it. For who decides, a
 * later revision is held against what was decided before it.
 */
export function chooseRuns(
  runs: readonly FinishedRun[],
  { decides }: { readonly decides: boolean },
): { readonly from: FinishedRun | null; readonly to: FinishedRun | null } {
  const [to, ...before] = runs;
  if (!to) return { from: null, to: null };
  const earlier = before.find((run) => run.n < to.n) ?? null;
  if (decides && earlier) return { from: earlier, to };
  const other = before.find((run) => run.n < to.n || run.workbook !== to.workbook);
  return { from: other ?? before.at(-1) ?? null, to };
}
