import type { Severity } from '#shared/findings/types.ts';
import { fieldTitle } from '#shared/records/field-meta.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import type { Kind, SourceRow } from '#shared/records/types.ts';
import type {
  BatchView,
  CheckContext,
  FindingDraft,
  LineRule,
  Rule,
  StandardInForce,
} from '#shared/rules/types.ts';
import { ruleSetting } from '#shared/standard/rule-setting.ts';
import type { RuleSetting } from '#shared/standard/types.ts';
import { changedToPass } from './changed-to-pass.ts';
import type { PreparedLine } from './prepared.ts';
import { recordNameOf } from './record-name.ts';
import type { ViewedLine } from './line-view.ts';
import type { Found } from './to-finding.ts';

const UNPROVED = 'unproved';
const CHANGED = 'changed-to-pass';

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

type InUse = { readonly rule: LineRule; readonly setting: RuleSetting };

/** The rules that run on lines of a kind under a standard; found once, not line by line. */
const rulesInUse = (rules: readonly Rule[], context: CheckContext) => {
  const known = new Map<StandardInForce, Map<Kind, readonly InUse[]>>();
  const find = ({ view, standard }: ViewedLine): readonly InUse[] =>
    rules.flatMap((rule): InUse[] => {
      if (rule.scope !== 'line' || !rule.kinds.includes(view.kind)) return [];
      const setting = ruleSetting(standard.body, rule.code);
      if (setting?.on !== true || rule.needs.some((part) => context[part] === null)) return [];
      return [{ rule, setting }];
    });
  return (viewed: ViewedLine): readonly InUse[] => {
    const ofKind = known.get(viewed.standard) ?? new Map<Kind, readonly InUse[]>();
    known.set(viewed.standard, ofKind);
    const found = ofKind.get(viewed.view.kind) ?? find(viewed);
    ofKind.set(viewed.view.kind, found);
    return found;
  };
};

/** What all rules find on one line. One `unproved` a blank cell, whichever rules needed it. */
export const lineRunner = (
  rules: readonly Rule[],
  context: CheckContext,
): ((viewed: ViewedLine) => readonly Found[]) => {
  const running = rulesInUse(rules, context);
  return (viewed) => runLineRules(viewed, { running: running(viewed), rules, context });
};

const runLineRules = (
  viewed: ViewedLine,
  {
    running,
    rules,
    context,
  }: {
    readonly running: readonly InUse[];
    readonly rules: readonly Rule[];
    readonly context: CheckContext;
  },
): readonly Found[] => {
  const { view, line, standard } = viewed;
  const found: Found[] = [];
  const blank = new Map<string, Found>();
  const unproved = ruleSetting(standard.body, UNPROVED);
  for (const { rule, setting } of running) {
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
  const all = [...found, ...blank.values()];
  return [...all, ...changedFound(rules, viewed, { context, found: all })];
};

/** `changed-to-pass`: a rule that runs, is met now, and was not at an earlier check of other values. */
const changedFound = (
  rules: readonly Rule[],
  { view, line, standard }: ViewedLine,
  { context, found }: { readonly context: CheckContext; readonly found: readonly Found[] },
): readonly Found[] => {
  const changed = rules.find(({ code }) => code === CHANGED);
  const setting = ruleSetting(standard.body, CHANGED);
  if (!changed || setting?.on !== true || context.previous === null) return [];
  const earlier = context.previous.get(lineKey(view.kind, view.structureNumber, view.occurrence)) ?? [];
  if (earlier.length === 0) return [];
  const failing = new Set(found.map(({ code }) => code));
  const met = rules.filter(
    (rule) =>
      rule.scope === 'line' &&
      !failing.has(rule.code) &&
      ruleSetting(standard.body, rule.code)?.on === true &&
      rule.needs.every((part) => context[part] !== null),
  );
  const titles = new Map(met.map(({ code, title }) => [code, title]));
  return changedToPass({ view, earlier, titles }).map((draft) =>
    toFound(changed, setting.severity, draft, { line, source: draft.source ?? view.source }),
  );
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
