import type { Severity } from '#shared/findings/types.ts';
import { fieldTitle } from '#shared/records/field-meta.ts';
import type { SourceRow } from '#shared/records/types.ts';
import type { BatchView, CheckContext, FindingDraft, Rule, StandardInForce } from '#shared/rules/types.ts';
import { ruleSetting } from '#shared/standard/rule-setting.ts';
import type { PreparedLine } from './prepared.ts';
import { recordNameOf } from './record-name.ts';
import type { ViewedLine } from './line-view.ts';
import type { Found } from './to-finding.ts';

const UNPROVED = 'unproved';

type Place = { readonly line: PreparedLine | null; readonly source: SourceRow };

const toFound = (rule: Rule, severity: Severity, draft: FindingDraft, { line, source }: Place): Found => ({
  code: rule.code,
  severity: draft.severity ?? severity,
  line,
  source,
  field: draft.field === undefined ? rule.field : draft.field,
  measured: draft.measured,
  limit: draft.limit,
  margin: draft.margin,
  unit: draft.unit,
  uncertainty: draft.uncertainty ?? null,
  ...(draft.params ? { params: draft.params } : {}),
  ...(draft.ownerParams ? { ownerParams: draft.ownerParams } : {}),
  part: draft.part ?? '',
});

/** `unproved` of one field: what stood there (a word, or nothing) and which rules lacked it. */
const unprovedFound = (
  field: string,
  place: Place & { readonly part: string },
  severity: Severity,
): Found => {
  const said = place.source.values[field];
  return {
    code: UNPROVED,
    severity,
    line: place.line,
    source: place.source,
    field,
    measured: said,
    limit: null,
    margin: null,
    unit: null,
    params: { title: fieldTitle(recordNameOf(place.source.sheet, place.line?.kind ?? 'set'), field) },
    part: place.part,
  };
};

/** What all rules find on one line. One `unproved` a blank cell, whichever rules needed it. */
export const runLineRules = (
  rules: readonly Rule[],
  { view, line, standard }: ViewedLine,
  context: CheckContext,
): readonly Found[] => {
  const found: Found[] = [];
  const blank = new Map<string, Found>();
  const unproved = ruleSetting(standard.body, UNPROVED);
  for (const rule of rules) {
    if (rule.scope !== 'line' || !rule.kinds.includes(view.kind)) continue;
    const setting = ruleSetting(standard.body, rule.code);
    if (setting?.on !== true || rule.needs.some((part) => context[part] === null)) continue;
    for (const draft of rule.check(view, setting.params, context)) {
      const source = draft.source ?? view.source;
      if (draft.unproved === undefined) {
        found.push(toFound(rule, setting.severity, draft, { line, source }));
        continue;
      }
      const part = draft.part ?? '';
      const key = `${source.sheet}|${source.row}|${draft.unproved}|${source === view.source ? part : ''}`;
      if (unproved?.on !== true || blank.has(key)) continue;
      blank.set(key, unprovedFound(draft.unproved, { line, source, part }, unproved.severity));
    }
  }
  return [...found, ...blank.values()];
};

/** What the rules on the whole batch find, by the standard of its last work day. */
export const runBatchRules = (
  rules: readonly Rule[],
  {
    batch,
    lineOf,
    standard,
  }: {
    readonly batch: BatchView;
    readonly lineOf: ReadonlyMap<unknown, PreparedLine>;
    readonly standard: StandardInForce;
  },
  context: CheckContext,
): readonly Found[] =>
  rules.flatMap((rule): Found[] => {
    if (rule.scope !== 'batch' || rule.needs.some((part) => context[part] === null)) return [];
    const setting = ruleSetting(standard.body, rule.code);
    if (setting?.on !== true) return [];
    return rule.check(batch, setting.params, context).map((draft) =>
      toFound(rule, setting.severity, draft, {
        line: draft.line ? (lineOf.get(draft.line) ?? null) : null,
        source: draft.source ?? draft.line?.source ?? batch.batch,
      }),
    );
  });
