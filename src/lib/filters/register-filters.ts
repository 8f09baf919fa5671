import type { FilterDefinition } from '#src/components/table/filter-bar.tsx';
import { useContractorOptions, useWorkOrderOptions } from '#src/lib/filters/reference-options.ts';
import { KIND_OPTIONS, RULE_OPTIONS } from '#src/lib/filters/rule-options.ts';

export const REGISTER_FILTERS = [
  'q',
  'workOrder',
  'contractor',
  'kind',
  'from',
  'to',
  'lot',
  'conforming',
  'rule',
  'versions',
] as const;
export const REGISTER_SORTS = ['structure', 'installed', 'entered'] as const;

/** The filters of the register, as the address and a transmittal's scope name them. */
export function useRegisterFilterDefinitions(): readonly FilterDefinition[] {
  const contractors = useContractorOptions();
  const workOrders = useWorkOrderOptions();
  return [
    { name: 'q', label: 'Structure or record begins' },
    { name: 'workOrder', label: 'Work order', any: 'all', options: workOrders },
    ...(contractors ? [{ name: 'contractor', label: 'Contractor', any: 'all', options: contractors }] : []),
    { name: 'kind', label: 'Kind', any: 'all', options: KIND_OPTIONS },
    { name: 'from', label: 'Installed from', type: 'date' },
    { name: 'to', label: 'to', type: 'date' },
    { name: 'lot', label: 'Lot', any: 'all' },
    {
      name: 'conforming',
      label: 'Conforming',
      options: [
        { value: 'yes', label: 'yes' },
        { value: 'no', label: 'by concession' },
      ],
    },
    { name: 'rule', label: 'Conceded rule', options: RULE_OPTIONS },
    { name: 'versions', label: 'Versions', any: 'current', options: [{ value: 'all', label: 'all' }] },
  ];
}
