import { useQuery } from '@tanstack/react-query';
import { organisationsQuery, workOrderChoicesQuery } from '#src/lib/api/reference-lists.ts';
import { useCan } from '#src/lib/session/use-can.ts';

type Option = { readonly value: string; readonly label: string };

/** Contractors to choose from; null for people who see their own only. */
export function useContractorOptions(): readonly Option[] | null {
  const allowed = useCan('read', 'Organisation');
  const { data } = useQuery({ ...organisationsQuery, enabled: allowed });
  if (!allowed) return null;
  return (data ?? [])
    .filter((one) => one.kind === 'contractor')
    .map((one) => ({ value: one.id, label: one.name }));
}

export function useWorkOrderOptions(): readonly Option[] {
  const { data } = useQuery(workOrderChoicesQuery);
  return (data ?? []).map((order) => ({ value: order.id, label: `${order.number} ${order.title}` }));
}
