/** Bits of a perceptual hash, written as hexadecimal digits. */
const HEX = /^[0-9a-f]{16}$/i;
const BITS = 64;

/** The hash as its bits, or null for what is none. */
export const hashBits = (phash: string | null): string | null =>
  phash !== null && HEX.test(phash)
    ? Array.from({ length: 16 }, (_, n) =>
        Number.parseInt(phash.charAt(n), 16).toString(2).padStart(4, '0'),
      ).join('')
    : null;

/** In how many bits two hashes differ. */
export const bitsApart = (a: string, b: string): number => {
  let apart = 0;
  for (let i = 0; i < BITS; i += 1) if (a[i] !== b[i]) apart += 1;
  return apart;
};

/** Pieces of a hash, one more than the bits that may differ: two hashes so near share a piece. */
export const bandsOf = (bits: string, mayDiffer: number): readonly string[] => {
  const count = Math.min(BITS, Math.floor(mayDiffer) + 1);
  return Array.from({ length: count }, (_, n) => {
    const from = Math.floor((n * BITS) / count);
    return `${n}|${bits.slice(from, Math.floor(((n + 1) * BITS) / count))}`;
  });
};
