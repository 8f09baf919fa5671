/** Unit words as people write them, by the unit they mean. Texts are lower case without a closing full stop. */
const WORDS: readonly (readonly [string, RegExp])[] = [
  ['ft', /^(?:ft|feet|foot|')$/],
  ['in', /^(?:in|ins|inch|inches|")$/],
  ['in-per-10ft', /^(?:in|inch|inches|") ?(?:per|\/|in|over) ?10 ?(?:ft|feet|foot|')$/],
  ['in-per-ft', /^(?:in|inch|inches|") ?(?:per|\/) ?(?:1 ?)?(?:ft|feet|foot|')$/],
  ['ft3', /^(?:ft3|ft³|ft\^3|cu\.? ?ft|cf|cubic (?:feet|foot))$/],
  ['degF', /^(?:° ?f|f|deg\.? ?f|degrees? f|fahrenheit|degrees? fahrenheit)$/],
  ['degC', /^(?:° ?c|c|deg\.? ?c|degrees? c|celsius|degrees? celsius)$/],
  ['deg', /^(?:°|deg|degrees?)$/],
  ['count', /^(?:kits?|pcs?|ea|each)$/],
  ['yd', /^(?:yds?|yards?)$/],
  ['m', /^(?:m|met(?:er|re)s?)$/],
  ['cm', /^(?:cms?|centimet(?:er|re)s?)$/],
  ['mm', /^(?:mms?|millimet(?:er|re)s?)$/],
  ['m3', /^(?:m3|m³|m\^3|cubic met(?:er|re)s?)$/],
  ['l', /^(?:l|lit(?:er|re)s?)$/],
  ['gal', /^(?:gals?|gallons?)$/],
  ['percent', /^(?:%|percent)$/],
  ['lb', /^(?:lbs?|pounds?|#)$/],
];

/** The unit that a word means; null for no unit known. */
export function unitOfWord(word: string): string | null {
  const plain = word.replace(/\.$/, '').trim();
  return WORDS.find(([, pattern]) => pattern.test(plain))?.[0] ?? null;
}
