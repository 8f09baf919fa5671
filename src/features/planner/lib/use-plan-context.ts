import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { standardInForceQuery } from '#src/features/work-orders/api/standard-in-force.ts';
import { productsQuery } from '#src/lib/api/reference-lists.ts';
import { localToday } from '#src/lib/local-today.ts';
import type { PlanContext } from '#shared/planner/plan-types.ts';
import type { Product } from '#shared/standard/types.ts';

export type PlanSources = {
  /** Null while it is fetched, and where no standard is in force. */
  readonly context: PlanContext | null;
  readonly products: readonly Product[];
  readonly pending: boolean;
  readonly error: Error | null;
  readonly retry: () => void;
};

/** The standard in force today and the foam chosen, the first where none is. */
export function usePlanContext(productCode: string | undefined): PlanSources {
  const standard = useQuery(standardInForceQuery(localToday()));
  const offered = useQuery(productsQuery);
  const products = useMemo(
    () => (offered.data ?? []).map(({ body }) => body as unknown as Product),
    [offered.data],
  );
  const product = products.find(({ code }) => code === productCode) ?? products[0] ?? null;
  const inForce = standard.data ?? null;
  const context = useMemo(
    () => (inForce === null ? null : { standard: inForce, product }),
    [inForce, product],
  );
  return {
    context,
    products,
    pending: standard.isPending || offered.isPending,
    error: standard.error ?? offered.error,
    retry: () => {
      void standard.refetch();
      void offered.refetch();
    },
  };
}
