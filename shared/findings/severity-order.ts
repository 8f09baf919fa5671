import { SEVERITIES, type Finding, type Severity } from './types.ts';

/** Nonconformities first, then queries, then notes. */
export const severityOrder = (a: Severity, b: Severity): number =>
  SEVERITIES.indexOf(a) - SEVERITIES.indexOf(b);

/** The gravest severity of some findings; null when there are none. */
export const worstSeverity = (findings: readonly Pick<Finding, 'severity'>[]): Severity | null =>
  SEVERITIES.find((severity) => findings.some((finding) => finding.severity === severity)) ?? null;
