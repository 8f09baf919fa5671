import { isUnit } from '#shared/units/convert.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';
import type { SheetFinding } from './sheet-types.ts';

/** A number keeps its word and its unit on one line; a phrase may be broken. */
function part(
  word: string,
  value: number | string,
  { unit, metric }: { unit: string | null; metric: boolean },
): string {
  if (typeof value === 'string') return `${word} ${value}`;
  return `${word} ${formatQuantity(value, unit ?? '', { metric })}`.replaceAll(' ', '\u00a0');
}

/** `measured 5.80 ft, limit 6.00 ft, margin −0.20 ft`; what is not known is left out. */
export function findingText(finding: SheetFinding, metric: boolean): string {
  const { measured, limit, margin, unit } = finding;
  const as = { unit, metric };
  // A word alone, as of the view that a missing photograph should show, is no limit.
  if (measured === null && typeof limit !== 'number') return '';
  const parts: string[] = [];
  if (measured !== null) parts.push(part('measured', measured, as));
  if (limit !== null) parts.push(part('limit', limit, as));
  if (margin !== null && isUnit(unit ?? '')) parts.push(part('margin', margin, as));
  return parts.join(', ');
}

/** `Finding 1: Embedment short; measured 5.80 ft, limit 6.00 ft, margin −0.20 ft.` */
export function findingSentence(finding: SheetFinding, metric: boolean): string {
  const text = findingText(finding, metric);
  return `Finding ${finding.number}: ${finding.title}${text ? `; ${text}` : ''}.`;
}
