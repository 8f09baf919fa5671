import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

/** The id a step away; stays at the ends. Where the current one is not in the list, the first. */
export function stepTo(ids: readonly string[], current: string | null, step: number): string | null {
  const at = current === null ? -1 : ids.indexOf(current);
  if (at < 0) return ids[0] ?? null;
  return ids[Math.max(0, Math.min(ids.length - 1, at + step))] ?? null;
}

export type FindingStep =
  | { readonly line: string; readonly finding: string }
  | { readonly line: string; readonly end: 'first' | 'last' };

/** The next open finding: on this line, else on the next line that has one, and round to the beginning. Null: none is left. */
export function stepToFinding(options: {
  readonly lines: readonly RecordRow[];
  readonly line: string | null;
  /** Findings to decide of the line, in the order of the list. */
  readonly findings: readonly FindingRow[];
  readonly active: string | null;
  readonly step: 1 | -1;
}): FindingStep | null {
  const { lines, line, findings, active, step } = options;
  const ordered = step === 1 ? findings : findings.toReversed();
  const from = ordered.findIndex((finding) => finding.id === active);
  const next = ordered.slice(from + 1).find((finding) => finding.state === 'undecided');
  if (line !== null && next) return { line, finding: next.id };
  const at = lines.findIndex((one) => one.id === line);
  const others = [...lines.slice(at + 1), ...lines.slice(0, Math.max(0, at))];
  const open = (step === 1 ? others : others.toReversed()).find((one) => one.counts.undecided > 0);
  if (open) return { line: open.id, end: step === 1 ? 'first' : 'last' };
  const first = ordered.find((finding) => finding.state === 'undecided' && finding.id !== active);
  return line !== null && first ? { line, finding: first.id } : null;
}

/** The finding in hand: the one chosen, else the first (or last) that is open, else the first. */
export function findingInHand(
  findings: readonly FindingRow[],
  chosen: string | null,
  end: 'first' | 'last',
): FindingRow | null {
  const picked = findings.find((finding) => finding.id === chosen);
  if (picked) return picked;
  const open = findings.filter((finding) => finding.state === 'undecided');
  return (end === 'last' ? open.at(-1) : open[0]) ?? findings[0] ?? null;
}
