import type { FieldErrors, FieldValues, Path, UseFormReturn } from 'react-hook-form';
import { ApiProblem } from '#src/lib/api/api-problem.ts';

export type Fault = { readonly name: string | null; readonly message: string };

/** The errors of a form in one flat list; `name` null: it belongs to no field. */
export function faultsOf(errors: FieldErrors, path = ''): Fault[] {
  const faults: Fault[] = [];
  for (const [key, value] of Object.entries(errors)) {
    if (typeof value !== 'object' || value === null) continue;
    const name = path ? `${path}.${key}` : key;
    const message = 'message' in value && typeof value.message === 'string' ? value.message : null;
    if (message) faults.push({ name: name.startsWith('root') ? null : name, message });
    else if (key !== 'ref') faults.push(...faultsOf(value as FieldErrors, name));
  }
  return faults;
}

/** `/values/boreTopIn` -> `values.boreTopIn` (RFC 6901 escapes undone). */
export function fieldOfPointer(pointer: string): string {
  return pointer
    .split('/')
    .slice(1)
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.');
}

/** Puts what the server refused beside the fields it names; the rest goes to the summary alone. */
export function placeProblem<T extends FieldValues>(form: UseFormReturn<T>, error: unknown): void {
  if (!(error instanceof ApiProblem)) throw error;
  let placed = 0;
  for (const [index, entry] of error.errors.entries()) {
    const name = fieldOfPointer(entry.pointer);
    if (hasField(form.getValues(), name)) {
      form.setError(name as Path<T>, { type: entry.code, message: entry.detail });
      placed += 1;
    } else {
      form.setError(`root.entry${index}`, { type: entry.code, message: entry.detail });
    }
  }
  if (placed < error.errors.length || error.errors.length === 0) {
    form.setError('root.problem', { type: error.code, message: error.message });
  }
}

/** `scope.workOrder` is a field where the form's values hold it. */
function hasField(values: FieldValues, name: string): boolean {
  let at: unknown = values;
  return name.split('.').every((part) => {
    if (typeof at !== 'object' || at === null || !Object.hasOwn(at, part)) return false;
    at = (at as Record<string, unknown>)[part];
    return true;
  });
}
