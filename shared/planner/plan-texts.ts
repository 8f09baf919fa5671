import { planField } from './plan-fields.ts';

/** What was typed, by field. A field that was emptied holds an empty text; one that nobody touched is absent. */
export type PlanTexts = Readonly<Record<string, string>>;

/** Price of a kit, and kits at hand, by nominal size: `price-2.5`, `hand-8`. */
const BY_SIZE = /^(?:price|hand)-\d{1,3}(?:\.\d{1,4})?$/;
/** Longer text than any field holds is cut, so that no address can make the page slow. */
const MOST_CHARACTERS = 200;

const isPlanKey = (key: string): boolean => planField(key) !== null || BY_SIZE.test(key);

/** What an address holds of the planner; anything else in it is left alone. */
export function readPlanTexts(search: URLSearchParams): PlanTexts {
  const texts: Record<string, string> = {};
  for (const [key, text] of search) if (isPlanKey(key)) texts[key] = text.slice(0, MOST_CHARACTERS);
  return texts;
}

/** The address with these texts in it, keys in order, so that the same plan has one address. */
export function writePlanTexts(search: URLSearchParams, texts: PlanTexts): URLSearchParams {
  const next = new URLSearchParams([...search].filter(([key]) => !isPlanKey(key)));
  for (const [key, text] of Object.entries(texts)) if (isPlanKey(key)) next.set(key, text);
  next.sort();
  return next;
}

/** What is assumed alike for every structure of a work order: no part of one structure's design. */
export function sharedTexts(texts: PlanTexts): PlanTexts {
  return Object.fromEntries(Object.entries(texts).filter(([key]) => planField(key)?.ofDesign !== true));
}

/** Amounts by kit size, as typed: `price-8` -> 8. Null: blank, or no amount. */
export function amountBySize(texts: PlanTexts, what: 'price' | 'hand', kitFt3: number): number | null {
  const text = (texts[`${what}-${kitFt3}`] ?? '').trim().replaceAll(',', '').replace(/^\$/, '');
  if (!/^\d{1,7}(?:\.\d{1,4})?$/.test(text)) return null;
  const amount = Number(text);
  return what === 'hand' && !Number.isInteger(amount) ? null : amount;
}

/** What is wrong with an amount by size; null: nothing, or blank. */
export function amountFault(texts: PlanTexts, what: 'price' | 'hand', kitFt3: number): string | null {
  const text = (texts[`${what}-${kitFt3}`] ?? '').trim();
  if (text === '' || amountBySize(texts, what, kitFt3) !== null) return null;
  return what === 'price'
    ? `“${text}” is no price. Write an amount, such as 85.50.`
    : `“${text}” is no count of kits. Write a whole number.`;
}
