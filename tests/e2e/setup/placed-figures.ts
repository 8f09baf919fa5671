/** Of a finding: the rule, where it stands and its figures. */
const KEYS = ['structureNumber', 'sheet', 'cell', 'severity', 'measured', 'limit', 'margin', 'unit'] as const;
/** Places to which the literals are worked out. */
const PLACES = 4;
/** 2126-04-15T08:00 in Chicago, daylight saving: 13:00 UTC. */
const STILL_TO_COME = Date.UTC(2126, 3, 15, 13);

const rounded = (value: unknown): unknown =>
  typeof value === 'number' ? Number(value.toFixed(PLACES)) : (value ?? null);

/** Limit and margin of `clock-future` are the moment of the check, and the minutes until then. */
const untilThen = (asOf: string) => ({
  limit: new Date(asOf)
    .toLocaleString('sv-SE', { timeZone: 'America/Chicago' })
    .slice(0, 16)
    .replace(' ', 'T'),
  margin: rounded((Date.parse(asOf) - STILL_TO_COME) / 60_000),
});

/** By rule and structure; the expected ones with the moment of the check. */
export const placedFigures = (findings: readonly object[], asOf?: string): readonly object[] =>
  findings
    .map((finding) => {
      const known = new Map<string, unknown>(Object.entries(finding));
      const code = String(known.get('code'));
      return {
        code,
        ...Object.fromEntries(KEYS.map((key) => [key, rounded(known.get(key))])),
        ...(asOf !== undefined && code === 'clock-future' ? untilThen(asOf) : {}),
      };
    })
    .toSorted((a, b) => (JSON.stringify(a) < JSON.stringify(b) ? -1 : 1));
