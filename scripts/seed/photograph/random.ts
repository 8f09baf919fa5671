export type Random = {
  /** from `least` up to `most` */
  between: (least: number, most: number) => number;
  whole: (least: number, most: number) => number;
  pick: <T>(choices: readonly T[]) => T;
  chance: (share: number) => boolean;
};

/** A small seeded generator (mulberry32): the same seed draws the same demo on every machine. */
export function createRandom(seed: number): Random {
  let state = seed >>> 0;
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
  const whole = (least: number, most: number): number => least + Math.floor(next() * (most - least + 1));
  return {
    between: (least, most) => least + next() * (most - least),
    whole,
    pick: (choices) => choices[whole(0, choices.length - 1)]!,
    chance: (share) => next() < share,
  };
}

/** A seed from a text (FNV-1a), such as a structure number with a view. */
export function seedOf(text: string): number {
  let hash = 0x811c9dc5;
  for (const char of text) hash = Math.imul(hash ^ char.codePointAt(0)!, 0x01000193);
  return hash >>> 0;
}
