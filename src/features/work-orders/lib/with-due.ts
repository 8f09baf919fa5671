import { dueDepthFt } from '#shared/calc/due-depth.ts';
import type { PlannedStructure } from '#shared/generated/api-types.ts';
import type { Standard } from '#shared/standard/types.ts';

export type DesignRow = PlannedStructure & {
  /** Depth due, ft: the larger of the design's and the standard's; null where neither is known. */
  readonly dueFt: number | null;
};

/** The design list with the embedment due of each pole to be set. In rock it depends on the bore: then only the design's is known. */
export function withDue(rows: readonly PlannedStructure[], standard: Standard | null): readonly DesignRow[] {
  return rows.map((row) => {
    const { poleLengthFt, ground, embedmentFt } = row.design;
    const values = {
      ...(poleLengthFt === null ? {} : { poleLengthFt }),
      ...(ground === null ? {} : { ground }),
    };
    const due =
      row.kind === 'set' && standard
        ? dueDepthFt({ values, standard, designEmbedmentFt: embedmentFt })
        : null;
    return { ...row, dueFt: due ?? embedmentFt };
  });
}
