import { isIncomplete, wantsLook, type BatchView, type LineView } from './line-view.ts';
import type { FilterValues } from '#src/lib/filters/filter-params.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

export const LINE_FILTERS = ['show', 'severity', 'rule', 'state', 'structure'] as const;
export type Show = 'want' | 'clean' | 'all' | 'incomplete';

/** What is shown when nothing was chosen: what wants a look, where anything does. */
export function shownOf(values: FilterValues, view: BatchView): Show {
  const chosen = values['show'];
  if (chosen === 'want' || chosen === 'clean' || chosen === 'all' || chosen === 'incomplete') return chosen;
  return view.lines.some(wantsLook) || view.loose.length > 0 ? 'want' : 'all';
}

/** Lines that pass, each with only those of its findings that pass. */
export function filterLines(view: BatchView, values: FilterValues): BatchView {
  const show = shownOf(values, view);
  const passes = (finding: FindingRow): boolean =>
    (!values['severity'] || finding.severity === values['severity']) &&
    (!values['rule'] || finding.code === values['rule']) &&
    (show !== 'incomplete' || isIncomplete(finding));
  const byFinding = Boolean(values['severity'] || values['rule']) || show === 'incomplete';
  const wanted = values['structure']?.toLowerCase();
  const lines: LineView[] = [];
  for (const line of view.lines) {
    if (show === 'want' && !wantsLook(line)) continue;
    if (show === 'clean' && wantsLook(line)) continue;
    if (values['state'] && line.record.state !== values['state']) continue;
    if (wanted && !line.record.structureNumber.toLowerCase().includes(wanted)) continue;
    const findings = byFinding ? line.findings.filter(passes) : line.findings;
    if (byFinding && findings.length === 0) continue;
    lines.push(byFinding ? { ...line, findings } : line);
  }
  const loose = show === 'clean' || values['state'] || wanted ? [] : view.loose.filter(passes);
  return { lines, loose };
}

export type RuleCount = { readonly code: string; readonly title: string; readonly count: number };

/** The rules that found anything, most often first. */
export function rulesOf(view: BatchView): RuleCount[] {
  const counts = new Map<string, RuleCount>();
  for (const finding of [...view.loose, ...view.lines.flatMap((line) => line.findings)]) {
    const { code, title } = finding;
    counts.set(code, { code, title, count: (counts.get(code)?.count ?? 0) + 1 });
  }
  return [...counts.values()].sort((a, b) => b.count - a.count || a.title.localeCompare(b.title));
}
