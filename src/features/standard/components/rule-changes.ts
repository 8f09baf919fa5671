import { formatQuantity } from '#shared/units/format-quantity.ts';
import { ruleRows, type RuleRow } from './rule-table.ts';

export type RuleChange = {
  readonly code: string;
  readonly title: string;
  readonly before: string;
  readonly after: string;
};

/** `nonconformity; Least gap 2 in` or `off`. */
export function settingText(row: RuleRow, metric = false): string {
  if (!row.on) return 'off';
  const limits = row.limits.map(
    (limit) => `${limit.title} ${formatQuantity(limit.value, limit.unit, { metric })}`,
  );
  return [row.severity, ...limits].join('; ');
}

/** What differs between two versions, rule by rule in the order of the later one. */
export function ruleChanges(
  before: Readonly<Record<string, unknown>>,
  after: Readonly<Record<string, unknown>>,
): readonly RuleChange[] {
  const old = new Map(ruleRows(before).map((row) => [row.code, row]));
  return ruleRows(after).flatMap((row) => {
    const was = old.get(row.code);
    const texts = { before: was ? settingText(was) : 'not in it', after: settingText(row) };
    return texts.before === texts.after ? [] : [{ code: row.code, title: row.title, ...texts }];
  });
}
