import { RULES } from '#shared/rules/registry.ts';
import { noticeText } from '#shared/workbook/notice-text.ts';
import { RECORD_TEXT, type FindingText } from './record-text.ts';
import { say } from './say.ts';
import type { Scalar } from '#shared/records/types.ts';
import type { Finding } from './types.ts';

export type RenderedFinding = {
  /** In the trade's words, two or three of them. */
  readonly title: string;
  /** One or two sentences: what was found. */
  readonly message: string;
  /** What would put it right. */
  readonly remedy: string;
};

const RULE_TEXT: ReadonlyMap<string, FindingText> = new Map(RULES.map((rule) => [rule.code, rule]));

/** For a code of a later version than this program: what the data alone can say. */
const UNKNOWN: FindingText = {
  title: 'Finding',
  message: ({ code, measured, limit, unit }) =>
    `Rule ${code} was not met: ${say(measured, unit)} against ${say(limit, unit)}.`,
  remedy: () => 'Look the rule up in the standard.',
};

/** How the shortfall stands to what the readings can tell. It is said, and never a ground for approval. */
const uncertaintySentence = ({ uncertainty, margin, unit }: Finding): string => {
  if (uncertainty === null || margin === null) return '';
  const u = `± ${say(uncertainty, unit)} (k = 2)`;
  return -margin < uncertainty
    ? ` The difference of ${say(Math.abs(margin), unit)} is smaller than the uncertainty of the readings, ${u}.`
    : ` Uncertainty of the readings ${u}.`;
};

/** Said by the check itself where the owner has published no standard. */
const NO_STANDARD: FindingText = {
  title: 'No standard',
  message: () => 'The owner has no construction standard in force, so nothing can be judged.',
  remedy: () => 'Ask the owner to publish a standard.',
};

/** What concerns the workbook as a whole is worded with the reader; its parameters are all scalars. */
const noticeOf = ({ code, params, sheet }: Pick<Finding, 'code' | 'params' | 'sheet'>) => {
  const scalars = Object.entries(params).map(([name, value]) => [
    name,
    Array.isArray(value) ? value.join(', ') : value,
  ]);
  return noticeText({ code, params: Object.fromEntries(scalars) as Readonly<Record<string, Scalar>>, sheet });
};

const textOf = (code: string): FindingText | undefined =>
  RULE_TEXT.get(code) ?? RECORD_TEXT.get(code) ?? (code === 'standard-none' ? NO_STANDARD : undefined);

/** A finding in words: the same on screen, in mail, in exports and on the command line. */
export const renderFinding = (finding: Finding): RenderedFinding => {
  const known = textOf(finding.code);
  const notice = known ? null : noticeOf(finding);
  if (notice) return notice;
  const text = known ?? UNKNOWN;
  return {
    title: text.title,
    message: text.message(finding) + uncertaintySentence(finding),
    remedy: text.remedy(finding),
  };
};

/** A finding's title from its code alone, for lists and filters. */
export const findingTitle = (code: string): string =>
  textOf(code)?.title ?? noticeOf({ code, params: {}, sheet: null })?.title ?? UNKNOWN.title;
