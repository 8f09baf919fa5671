/** A flipped comparison that no input can tell from the one written, with the reason. */
export type Equivalent = {
  readonly file: string;
  /** The comparison as written, white space made single. */
  readonly code: string;
  readonly to: string;
  readonly why: string;
};

/** Kept honest by the run: an entry whose comparison is gone, or whose mutant a test kills, fails it. */
export const EQUIVALENT: readonly Equivalent[] = [];
