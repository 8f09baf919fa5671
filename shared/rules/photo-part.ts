import type { PhotoFact } from './types.ts';

/** Names a photograph by what it is, so that findings on two of a line stay apart. */
export const photoPart = ({ view, sha256 }: PhotoFact): string => `${view} ${sha256}`;
