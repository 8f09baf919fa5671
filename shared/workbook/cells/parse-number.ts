/** Digits with or without thousands commas in groups of three, and a decimal point. */
const DECIMAL = /^(?:\d{1,3}(?:,\d{3})+|\d+)?(?:\.\d*)?$/;
const MIXED = /^(?:(\d+)[ -])?(\d{1,3})\/(\d{1,3})$/;

export type Parsed = { readonly number: number } | { readonly fault: 'number' | 'separators' | 'fraction' };

/** An unsigned decimal or mixed number (`18.5`, `1,200`, `18 1/2`, `18-1/2`, `3/4`). Decimal commas are a fault: 6,5 could be 65 or 6.5. */
function parseUnsigned(text: string): Parsed {
  if (/\d/.test(text) && DECIMAL.test(text)) return { number: Number(text.replaceAll(',', '')) };
  const mixed = MIXED.exec(text);
  if (mixed) {
    const [, whole, over, under] = mixed;
    const [top, bottom] = [Number(over), Number(under)];
    if (bottom < 2 || (whole !== undefined && top >= bottom)) return { fault: 'fraction' };
    return { number: Number(whole ?? 0) + top / bottom };
  }
  return { fault: /^[\d.,]*\d[\d.,]*$/.test(text) ? 'separators' : 'number' };
}

/** Text of a number as people write it, sign first; cleaned by cleanMeasure before. */
export function parseNumber(text: string): Parsed {
  const sign = /^[+-] ?/.exec(text)?.[0] ?? '';
  const parsed = parseUnsigned(text.slice(sign.length));
  if ('fault' in parsed || !sign.startsWith('-')) return parsed;
  // Never a negative zero, which would print and compare oddly.
  return { number: parsed.number === 0 ? 0 : -parsed.number };
}

/** Splits `18 1/2 in.` into its number and the words after it. */
export function splitUnit(text: string): { readonly number: string; readonly unit: string } {
  const end = /[^\d.,/ +-]/.exec(text)?.index ?? text.length;
  return { number: text.slice(0, end).trim(), unit: text.slice(end).trim() };
}
