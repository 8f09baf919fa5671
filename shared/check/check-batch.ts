import { fingerprint } from '#shared/findings/fingerprint.ts';
import type { Finding } from '#shared/findings/types.ts';
import { canonical } from '#shared/records/canonical.ts';
import type { SourceBatch, WorkbookNotice } from '#shared/records/types.ts';
import { RULES } from '#shared/rules/registry.ts';
import type { CheckContext, StandardInForce } from '#shared/rules/types.ts';
import { cellFinder } from './cell-finder.ts';
import { standardInForce } from './in-force.ts';
import { clockOf } from './instants.ts';
import { viewLine, type ViewedLine } from './line-view.ts';
import { orderFindings, orderRecords } from './order.ts';
import { prepare } from './prepare.ts';
import type { PlacedIssue } from './prepared.ts';
import { lineRunner, runBatchRules } from './run-rules.ts';
import { skippedRules } from './skipped-rules.ts';
import { toFinding, type Found } from './to-finding.ts';
import type { CheckedRecord, CheckResult } from './types.ts';
import { uniqueFindings } from './unique-findings.ts';

const issueFound = ({ issue, row, line, part }: PlacedIssue): Found => ({
  ...issue,
  severity: issue.severity ?? 'nonconformity',
  line,
  source: row.source,
  part,
});

const noticeFinding = ({ code, severity, sheet, address, params }: WorkbookNotice): Finding => ({
  code,
  severity,
  kind: null,
  structureNumber: null,
  occurrence: null,
  sheet,
  row: address === null ? null : Number(/\d+$/.exec(address)?.[0] ?? 0) || null,
  cell: address,
  field: null,
  measured: null,
  limit: null,
  margin: null,
  unit: null,
  uncertainty: null,
  params,
  ownerParams: {},
  fingerprint: fingerprint([code, sheet, canonical(params)]),
});

const toRecord = (
  { view, line, standard, product }: ViewedLine,
  ruleCodes: readonly string[],
): CheckedRecord => ({
  kind: view.kind,
  structureNumber: view.structureNumber,
  occurrence: view.occurrence,
  sheet: view.source.sheet,
  row: view.source.row,
  source: line.row.source,
  values: view.values,
  derived: view.derived,
  workDay: view.workDay,
  standardId: standard.id,
  standardNumber: standard.n,
  product: product ? { code: product.code, n: product.n } : null,
  pours: view.pours,
  events: view.events.map((event) => ({ ...event.source, values: event.values })),
  ruleCodes,
});

/** The standard that batch-wide rules go by: the one of the last work day. */
const batchStandard = (views: readonly ViewedLine[], context: CheckContext): StandardInForce | null => {
  const days = views.flatMap(({ view }) => (view.workDay === null ? [] : [view.workDay]));
  return standardInForce(context.standards, days.toSorted().at(-1) ?? null);
};

/** A batch without any published standard: nothing can be judged, and that is said. */
const NO_STANDARD: WorkbookNotice = {
  code: 'standard-none',
  severity: 'nonconformity',
  sheet: null,
  address: null,
  params: {},
};

/**
 * Checks a batch: records with their derived figures, findings with place and stable fingerprint, and what did not
 * run. Total on whatever a workbook holds, linear in its rows, and the same for rows in any order (addresses apart).
 */
export const checkBatch = (source: SourceBatch, context: CheckContext): CheckResult => {
  const clock = clockOf(context.zone);
  const prepared = prepare(source, context, clock);
  const viewed = prepared.lines.flatMap((line) => viewLine(line, context, clock) ?? []);
  const found = [...prepared.issues.map(issueFound), ...viewed.flatMap(lineRunner(RULES, context))];
  const standard = batchStandard(viewed, context);
  if (standard) {
    const batch = {
      lines: viewed.map(({ view }) => view),
      pours: prepared.pours,
      orphans: prepared.orphans,
      batch: prepared.batch.source,
    };
    const lineOf = new Map(viewed.map(({ view, line }) => [view, line]));
    found.push(...runBatchRules(RULES, { batch, lineOf, standard }, context));
  }
  const cellOf = cellFinder(source);
  const notices = standard ? source.notices : [...source.notices, NO_STANDARD];
  const findings = uniqueFindings([
    ...found.map((one) => toFinding(one, cellOf)),
    ...notices.map(noticeFinding),
  ]);
  const codes = new Map<unknown, Set<string>>();
  for (const one of found)
    if (one.line) codes.set(one.line, (codes.get(one.line) ?? new Set()).add(one.code));
  const used = new Set(viewed.map((line) => line.standard));
  const records = orderRecords(
    viewed.map((line) => toRecord(line, [...(codes.get(line.line) ?? [])].toSorted())),
  );
  return {
    records,
    findings: orderFindings(findings, records),
    skipped: skippedRules(RULES, used.size > 0 ? [...used] : standard ? [standard] : [], context),
  };
};
