/** A 64-bit perceptual hash as its two halves, unsigned. */
export type PictureHash = { readonly high: number; readonly low: number };

/** A hash as it is kept: sixteen hexadecimal digits. */
const HEX = /^[0-9a-f]{16}$/i;
const BITS = 64;
const HALF = 32;

/** The hash of its digits, or null for what is none. */
export const pictureHash = (phash: string | null): PictureHash | null =>
  phash !== null && HEX.test(phash)
    ? { high: Number.parseInt(phash.slice(0, 8), 16), low: Number.parseInt(phash.slice(8), 16) }
    : null;

/** How many bits of 32 are set, by adding neighbours pairwise. */
const bitsSet = (half: number): number => {
  const pairs = half - ((half >>> 1) & 0x55555555);
  const fours = (pairs & 0x33333333) + ((pairs >>> 2) & 0x33333333);
  return Math.imul((fours + (fours >>> 4)) & 0x0f0f0f0f, 0x01010101) >>> 24;
};

/** In how many bits two hashes differ. */
export const bitsApart = (a: PictureHash, b: PictureHash): number =>
  bitsSet(a.high ^ b.high) + bitsSet(a.low ^ b.low);

/** The bits of a hash from one place to another, as a number; at most 16 of them. */
const piece = ({ high, low }: PictureHash, from: number, to: number): number => {
  const mask = 2 ** (to - from) - 1;
  if (to <= HALF) return (high >>> (HALF - to)) & mask;
  if (from >= HALF) return (low >>> (BITS - to)) & mask;
  return ((high << (to - HALF)) | (low >>> (BITS - to))) & mask;
};

/** Pieces of at most 16 bits, so many that two hashes so near have one in which they differ by a single bit at most. */
const piecesFor = (greatest: number): readonly (readonly [from: number, to: number])[] => {
  const count = Math.max(4, Math.floor(greatest / 2) + 1);
  const at = (n: number) => Math.floor((n * BITS) / count);
  return Array.from({ length: count }, (_, n) => [at(n), at(n + 1)] as const);
};

export type NearHashes = {
  /** Visits each hash of the index that differs in at most `greatest` bits, by its place; one may be visited twice. */
  readonly eachNear: (hash: PictureHash, visit: (place: number, apart: number) => void) => void;
};

/**
 * An index of hashes by their pieces: a table of chains for each piece, looked up at the piece's value and at each value
 * one bit off. So a search meets a handful of candidates, and a check stays linear in its photographs.
 */
export const nearHashes = (hashes: readonly PictureHash[], greatest: number): NearHashes => {
  const pieces = piecesFor(greatest);
  const oneOff = Math.floor(greatest / pieces.length) > 0;
  // Halves side by side: a search reads thousands of them, which as objects would lie all over the memory.
  const highs = Uint32Array.from(hashes, ({ high }) => high);
  const lows = Uint32Array.from(hashes, ({ low }) => low);
  const tables = pieces.map(([from, to]) => {
    const first = new Int32Array(2 ** (to - from)).fill(-1);
    const next = new Int32Array(hashes.length);
    hashes.forEach((hash, place) => {
      const value = piece(hash, from, to);
      next[place] = first[value] ?? -1;
      first[value] = place;
    });
    return { from, to, first, next };
  });
  return {
    eachNear: (hash, visit) => {
      for (const { from, to, first, next } of tables) {
        const value = piece(hash, from, to);
        for (let bit = -1; bit < (oneOff ? to - from : 0); bit += 1)
          for (
            let place = first[bit < 0 ? value : value ^ (1 << bit)] ?? -1;
            place >= 0;
            place = next[place] ?? -1
          ) {
            const apart = bitsSet(hash.high ^ (highs[place] ?? 0)) + bitsSet(hash.low ^ (lows[place] ?? 0));
            if (apart <= greatest) visit(place, apart);
          }
      }
    },
  };
};
