/** A figure and its unit on one line: the space between them does not break. For sentences that come ready made. */
export function keepTogether(sentence: string): string {
  return sentence
    .replace(/(\d) (?=(?:ft³|ft|in|min|°F|%|d|kB)(?![\w³]))/g, '$1\u00a0')
    .replace(/± (?=\d)/g, '±\u00a0')
    .replace(/k = (?=\d)/g, 'k\u00a0=\u00a0');
}
