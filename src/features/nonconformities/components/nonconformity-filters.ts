import type { FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useContractorOptions, useWorkOrderOptions } from '#src/lib/filters/reference-options.ts';
import { RULE_OPTIONS } from '#src/lib/filters/rule-options.ts';

export const NONCONFORMITY_FILTERS = [
  'rule',
  'severity',
  'state',
  'grounds',
  'contractor',
  'workOrder',
  'from',
  'to',
  'lot',
  'product',
  'q',
] as const;

export function useNonconformityFilterDefinitions(): readonly FilterDefinition[] {
  const contractors = useContractorOptions() ?? [];
  const workOrders = useWorkOrderOptions();
  return [
    { name: 'rule', label: 'Rule', options: RULE_OPTIONS },
    {
      name: 'severity',
      label: 'Severity',
      any: 'all but notes',
      options: [
        { value: 'nonconformity', label: 'nonconformity' },
        { value: 'query', label: 'query' },
        { value: 'note', label: 'note' },
      ],
    },
    {
      name: 'state',
      label: 'State',
      any: 'all',
      options: [
        { value: 'undecided', label: 'undecided' },
        { value: 'approved', label: 'approved' },
        { value: 'rejected', label: 'rejected' },
        { value: 'concession-asked', label: 'concession asked' },
      ],
    },
    {
      name: 'grounds',
      label: 'Grounds',
      any: 'all',
      options: [{ value: 'concession', label: 'concession' }],
    },
    { name: 'contractor', label: 'Contractor', any: 'all', options: contractors },
    { name: 'workOrder', label: 'Work order', any: 'all', options: workOrders },
    { name: 'from', label: 'Installed from', type: 'date' },
    { name: 'to', label: 'to', type: 'date' },
    { name: 'lot', label: 'Lot', any: 'all' },
    { name: 'product', label: 'Product', any: 'all' },
    { name: 'q', label: 'Structure begins' },
  ];
}
