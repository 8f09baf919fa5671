import type { RuleRow } from './rule-table.ts';

/** What the form of a draft holds: text as typed, so that nothing typed is ever lost or becomes another number. */
export type DraftValues = {
  effectiveOn: string;
  note: string;
  rules: Record<string, { on: boolean; severity: string; params: Record<string, string> }>;
};

export function draftValues(rows: readonly RuleRow[]): DraftValues {
  return {
    effectiveOn: '',
    note: '',
    rules: Object.fromEntries(
      rows.map((row) => [
        row.code,
        {
          on: row.on,
          severity: row.severity,
          params: Object.fromEntries(row.limits.map((limit) => [limit.key, String(limit.value)])),
        },
      ]),
    ),
  };
}

/** A number as typed; null for anything that is none. */
export function readLimit(text: string): number | null {
  const plain = text.trim().replace('−', '-');
  return /^-?(\d+(\.\d*)?|\.\d+)$/.test(plain) ? Number(plain) : null;
}

/** A sentence where the text cannot be the limit; null where it can. */
export function limitFault(
  text: string,
  { minimum, maximum }: { minimum: number; maximum: number },
): string | null {
  const value = readLimit(text);
  if (value === null) return 'Write a number, with a point for decimals.';
  if (value < minimum) return `Not below ${minimum}.`;
  if (value > maximum) return `Not above ${maximum}.`;
  return null;
}

/** The body of the version that is edited with the rules as the form has them; all else stays. */
export function draftBody(
  base: Readonly<Record<string, unknown>>,
  values: DraftValues,
): Record<string, unknown> {
  return {
    ...base,
    rules: Object.fromEntries(
      Object.entries(values.rules).map(([code, { on, severity, params }]) => [
        code,
        {
          on,
          severity,
          params: Object.fromEntries(Object.entries(params).map(([key, text]) => [key, readLimit(text)])),
        },
      ]),
    ),
  };
}
