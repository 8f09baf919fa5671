const VULGAR: Readonly<Record<string, string>> = {
  '½': '1/2',
  '⅓': '1/3',
  '⅔': '2/3',
  '¼': '1/4',
  '¾': '3/4',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

/** Surrounding blanks of every kind, also those that cannot be seen, taken away; inside they become plain spaces. */
export function trimText(text: string): string {
  return text
    .replace(/\u200b|\u200c|\u200d|\u2060|\ufeff/g, '')
    .replace(/[^\S\r\n]/g, ' ')
    .trim();
}

/**
 * Text made ready for reading a measure: full-width forms, typographic quotes, dashes, primes and fractions as the keys of a plain keyboard.
 * Deliberately not Unicode NFKC, which would turn 5² into 52 and 6½ into 61/2.
 */
export function cleanMeasure(text: string): string {
  return trimText(text)
    .replace(/[\uff01-\uff5e]/g, (sign) => String.fromCharCode(sign.charCodeAt(0) - 0xfee0))
    .replace(/[\u2212\u2010\u2011\u2012\u2013\ufe63]/g, '-')
    .replace(/[\u2044\u2215]/g, '/')
    .replace(/[‘’‛′´`ʹ]/g, "'")
    .replace(/[“”‟″ʺ]/g, '"')
    .replaceAll("''", '"')
    .replace(/[½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞]/g, (sign) => ` ${VULGAR[sign] ?? sign}`)
    .replace(/\s+/g, ' ')
    .trim()
    .toLowerCase();
}

/** Letters and figures alone, in lower case: `Not by us.` and `not-by-us` are one word. */
export function bareWord(text: string): string {
  return cleanMeasure(text).replace(/[^\p{L}\p{N}]/gu, '');
}
