import type { Finding, Severity } from './types.ts';

export const countFindings = (
  findings: readonly Pick<Finding, 'severity'>[],
): Readonly<Record<Severity, number>> => {
  const counts = { nonconformity: 0, query: 0, note: 0 };
  for (const finding of findings) counts[finding.severity] += 1;
  return counts;
};
