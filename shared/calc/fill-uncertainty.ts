/** Readings of one tape move together: a group is shifted as one, and each of its readings alone to see which matters most. */
export type ReadingGroup = {
  /** Standard uncertainty (k = 1), in the unit of the shift. */
  readonly u: number;
  /** The void with every reading of the group shifted; null where it cannot be computed. */
  readonly shifted: (by: number) => number | null;
  readonly readings: readonly { readonly field: string; readonly shifted: (by: number) => number | null }[];
};

/** What the readings of a group are of. */
export type ReadingSource = 'bore' | 'pole' | 'depth' | 'gap' | 'width';
export type SourcedGroup = ReadingGroup & { readonly source: ReadingSource };

export type FillUncertainty = {
  /** Expanded uncertainty of the fill ratio, k = 2. */
  readonly expanded: number;
  /** The reading that contributes most, the yield apart; null where no reading contributes. */
  readonly worstReading: string | null;
};

/** Step of the central difference. The void is a polynomial of third degree at most in any shift, so that the error is of the order of the step's square, 1e-8. */
const STEP = 1e-4;

function slope(shifted: (by: number) => number | null): number {
  const up = shifted(STEP);
  const down = shifted(-STEP);
  return up === null || down === null ? 0 : (up - down) / (2 * STEP);
}

type Contribution<G extends ReadingGroup = ReadingGroup> = { readonly group: G; readonly uV: number };

/** u_V of each group alone, ft³. */
export function contributions<G extends ReadingGroup>(groups: readonly G[]): readonly Contribution<G>[] {
  return groups.map((group) => ({ group, uV: Math.abs(slope(group.shifted)) * group.u }));
}

/** u_V of a void in ft³: root of the sum of squares over the groups, each fully correlated within (GUM, JCGM 100:2008, 5.1 and 5.2). */
export function voidUncertainty(groups: readonly ReadingGroup[]): number {
  return combined(contributions(groups));
}

const combined = (parts: readonly Contribution[]): number => Math.hypot(...parts.map(({ uV }) => uV));

/** The reading to measure again first: of the group that contributes most, the one that moves the void most. */
export function worstReading(groups: readonly ReadingGroup[]): string | null {
  return worstOf(contributions(groups));
}

function worstOf(parts: readonly Contribution[]): string | null {
  let worst: ReadingGroup | null = null;
  let most = 0;
  for (const { group, uV } of parts) {
    if (uV > most * (1 + 1e-9)) {
      most = uV;
      worst = group;
    }
  }
  let field: string | null = null;
  let steepest = 0;
  for (const reading of worst?.readings ?? []) {
    const steep = Math.abs(slope(reading.shifted));
    if (steep > steepest * (1 + 1e-9)) {
      steepest = steep;
      field = reading.field;
    }
  }
  return field;
}

/** Uncertainty of R = P/V: (u_R/R)² = (u_P/P)² + (u_V/V)², expanded U = 2u (JCGM 100:2008, 5.1.6 and 6.2). */
export function fillUncertainty({
  fillRatio,
  voidFt3,
  placedShare,
  groups,
}: {
  readonly fillRatio: number;
  readonly voidFt3: number;
  /** u_P/P. */
  readonly placedShare: number;
  readonly groups: readonly ReadingGroup[];
}): FillUncertainty {
  const parts = contributions(groups);
  const relative = Math.hypot(placedShare, combined(parts) / voidFt3);
  return { expanded: 2 * fillRatio * relative, worstReading: worstOf(parts) };
}
