import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { SheetLimits } from '#src/components/drawing/sheet-types.ts';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import type { Standard } from '#shared/generated/records.ts';

/** Limits that stand on the drawing beside what was measured. A rule that is off sets none. */
export function sheetLimits({ rules }: Pick<Standard, 'rules'>): SheetLimits {
  const annulus = rules['annulus-narrow'];
  const water = rules['water-deep'];
  const fill = rules['fill-short'];
  const lean = rules['lean-left'];
  const slope = rules['pad-slope'];
  return {
    ...(annulus.on ? { annulusLeastIn: annulus.params.leastGapIn } : {}),
    ...(water.on ? { waterMostIn: water.params.limitIn } : {}),
    ...(fill.on ? { fillLeast: fill.params.leastRatio } : {}),
    ...(lean.on ? { leanMostInPer10Ft: lean.params.limitInPer10Ft } : {}),
    ...(slope.on ? { slopeMostInPerFt: slope.params.limitInPerFt } : {}),
  };
}

/** A published version never changes, so its limits are asked for once. `n` 0: the line has no standard. */
export const sheetLimitsQuery = (n: number) =>
  queryOptions({
    queryKey: ['standard', n, 'limits'],
    queryFn: async ({ signal }) => {
      const version = await api<StandardVersion>(`/api/standard/versions/${n}`, { signal });
      return sheetLimits(version.body as unknown as Standard);
    },
    enabled: n > 0,
    staleTime: Number.POSITIVE_INFINITY,
  });
