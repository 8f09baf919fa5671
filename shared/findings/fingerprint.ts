/** Long identities are cut and closed with a hash, so that a fingerprint fits any index. */
const LONGEST = 200;

/** FNV-1a over UTF-16 units, twice with different seeds: 64 bits, enough to tell long texts apart. */
const hash = (text: string, seed: number): string => {
  let h = seed;
  for (let i = 0; i < text.length; i += 1) {
    h ^= text.charCodeAt(i);
    h = Math.imul(h, 0x01000193);
  }
  return (h >>> 0).toString(16).padStart(8, '0');
};

/** Control characters and halves of surrogate pairs have no place in a database's text. */
const plain = (text: string): string => text.replaceAll(/[\p{Surrogate}\p{Cc}]/gu, '\uFFFD');

/** Identity of a finding from its parts, the same over re-checks of the same fact. Rows and cells are no part of it. */
export const fingerprint = (parts: readonly (string | number | null | undefined)[]): string => {
  const whole = plain(parts.map((part) => String(part ?? '-').replaceAll(/[\\|]/g, '\\$&')).join('|'));
  if (whole.length <= LONGEST) return whole;
  return `${plain(whole.slice(0, LONGEST - 18))}~${hash(whole, 0x811c9dc5)}${hash(whole, 0x1234567)}`;
};
