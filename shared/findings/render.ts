import { RULES } from '#shared/rules/registry.ts';
import { NOTICE_TEXT } from './notice-text.ts';
import { RECORD_TEXT, type FindingText } from './record-text.ts';
import { say } from './say.ts';
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

const textOf = (code: string): FindingText =>
  RULE_TEXT.get(code) ?? RECORD_TEXT.get(code) ?? NOTICE_TEXT.get(code) ?? UNKNOWN;

/** A finding in words: the same on screen, in mail, in exports and on the command line. */
export const renderFinding = (finding: Finding): RenderedFinding => {
  const text = textOf(finding.code);
  return {
    title: text.title,
    message: text.message(finding) + uncertaintySentence(finding),
    remedy: text.remedy(finding),
  };
};

/** A finding's title from its code alone, for lists and filters. */
export const findingTitle = (code: string): string => textOf(code).title;
