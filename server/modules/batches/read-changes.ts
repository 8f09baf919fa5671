import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { recordNameOf } from '#shared/check/record-name.ts';
import type { CheckResult } from '#shared/check/types.ts';
import { compareChecks, type ValueChange } from '#shared/findings/compare.ts';
import { findingTitle } from '#shared/findings/render.ts';
import type { Finding } from '#shared/findings/types.ts';
import type { BatchChanges } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { fieldTitle, RECORD_FIELDS } from '#shared/records/field-meta.ts';
import { kindKey } from '#shared/records/structure-key.ts';
import { chooseRuns, type FinishedRun } from './choose-runs.ts';
import { loadRun } from './load-run.ts';

const NONE: BatchChanges = {
  from: null,
  to: null,
  items: [],
  added: [],
  removed: [],
  findings: { gone: [], new: [] },
};

/**
 * What the newest check changed against the one that `chooseRuns` holds it against; against an earlier revision, its
 * lines alone. The owner's people see only what was handed in.
 */
export async function readChanges(
  em: EntityManager,
  options: { batch: { id: string }; actor: Actor },
): Promise<BatchChanges> {
  const contractor = options.actor.orgKind === 'contractor';
  const runs = await rows<FinishedRun>(
    em,
    `select c.id, c.input, v.n, (
         select i.sha256 from inputs i
         where i.revision_id = v.id and i.kind = 'workbook' and i.n <= c.input order by i.n desc limit 1
       ) as workbook
     from revisions v join check_runs c on c.revision_id = v.id
     where v.batch_id = $1 and c.state = 'done' and ($2::boolean or v.submitted_at is not null)
       and (c.counts ->> 'lines')::int > 0
     order by v.n desc, c.input desc, c.finished_at desc`,
    [options.batch.id, contractor],
  );
  const { from, to } = chooseRuns(runs, { decides: !contractor });
  if (!to) return NONE;
  if (!from) return { ...NONE, to: to.input };
  const after = await loadRun(em, to.id);
  const whole = await loadRun(em, from.id);
  const before = from.n === to.n ? whole : narrow(whole, after);
  const changes = compareChecks(before, after);
  const isLine = (change: ValueChange) => change.field === 'structureNumber' && change.part === null;
  const lines = changes.values.filter(isLine);
  return {
    from: from.input,
    to: to.input,
    items: changes.values.filter((change) => !isLine(change)).map(toItem),
    added: lines.filter((change) => change.before === null).map((change) => change.structureNumber),
    removed: lines.filter((change) => change.after === null).map((change) => change.structureNumber),
    findings: { gone: changes.findings.gone.map(toTitle), new: changes.findings.fresh.map(toTitle) },
  };
}

/** The lines of `whole` that `after` has too: approved ones did not go away, they stand. */
function narrow(whole: CheckResult, after: CheckResult): CheckResult {
  const keys = new Set(after.records.map((record) => kindKey(record.kind, record.structureNumber)));
  return {
    ...whole,
    records: whole.records.filter((record) => keys.has(kindKey(record.kind, record.structureNumber))),
    findings: whole.findings.filter(
      (finding) => finding.kind !== null && keys.has(kindKey(finding.kind, finding.structureNumber)),
    ),
  };
}

function toItem(change: ValueChange): BatchChanges['items'][number] {
  const name = recordNameOf(change.sheet, change.kind);
  const title = fieldTitle(name, change.field);
  return {
    structureNumber: change.structureNumber,
    kind: change.kind,
    field: change.field,
    title: change.part === null ? title : `${title} (${change.part})`,
    before: plain(change.before),
    after: plain(change.after),
    unit: RECORD_FIELDS[name].get(change.field)?.unit ?? null,
    cell: change.cell === null ? null : `${change.sheet}!${change.cell}`,
  };
}

const plain = (value: ValueChange['before']): string | number | null =>
  typeof value === 'boolean' ? String(value) : value;
const toTitle = (finding: Finding) => ({
  code: finding.code,
  title: findingTitle(finding.code),
  structureNumber: finding.structureNumber,
});
