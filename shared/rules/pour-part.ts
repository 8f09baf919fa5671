import type { Pour } from './types.ts';

/** Names a pour row by what it says, so that findings of two rows stay apart whatever row they stand in. */
export const pourPart = ({ event, pourNumber, product, lot, kitFt3 }: Pour): string =>
  `event ${event} pour ${pourNumber ?? '?'} ${product ?? ''} ${lot ?? ''} ${kitFt3 ?? ''}`;
