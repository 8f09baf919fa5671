import { atLeast, atMost } from './slack.ts';
import type { FindingDraft } from './types.ts';

type Compared = Omit<FindingDraft, 'measured' | 'limit' | 'margin'> & {
  readonly measured: number;
  readonly limit: number;
};

/** Nothing when `measured` reaches `limit`; otherwise the finding, margin measured − limit. */
export const belowLimit = (compared: Compared): readonly FindingDraft[] =>
  Number.isFinite(compared.measured) && !atLeast(compared.measured, compared.limit)
    ? [{ ...compared, margin: compared.measured - compared.limit }]
    : [];

/** Nothing when `measured` stays within `limit`; otherwise the finding, margin limit − measured. */
export const aboveLimit = (compared: Compared): readonly FindingDraft[] =>
  Number.isFinite(compared.measured) && !atMost(compared.measured, compared.limit)
    ? [{ ...compared, margin: compared.limit - compared.measured }]
    : [];
