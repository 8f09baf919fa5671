import { useWorkOrderOptions } from '#src/lib/filters/reference-options.ts';
import { useRegisterFilterDefinitions } from '#src/lib/filters/register-filters.ts';
import { scopeText } from './scope-text.ts';

/** Scopes in words, with the names of what they point to. */
export function useScopeWords(): (scope: Readonly<Record<string, unknown>>) => string {
  const workOrders = useWorkOrderOptions();
  const filters = useRegisterFilterDefinitions();
  return (scope) => scopeText(scope, { workOrders, filters });
}
