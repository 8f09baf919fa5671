import { StateWord } from '#src/components/ui/state-word.tsx';
import { formatDay } from '#src/lib/formats.ts';
import { localToday } from '#src/lib/local-today.ts';
import type { Lot, LotEvent } from '#shared/generated/api-types.ts';

const STATUS = {
  'in-use': { glyph: 'tick', word: 'in use' },
  held: { glyph: 'lozenge', word: 'held' },
  recalled: { glyph: 'cross', word: 'recalled' },
} as const;

export function LotStatus({ status }: { status: Lot['status'] }) {
  return <StateWord {...STATUS[status]} />;
}

export const EVENT_WORDS: Readonly<Record<LotEvent['type'], string>> = {
  received: 'Received',
  held: 'Held',
  released: 'Released',
  recalled: 'Recalled',
};

type ExpiryProps = {
  readonly on: string | null;
  /** Where no heading says what day it is. */
  readonly worded?: boolean;
};

export function Expiry({ on, worded }: ExpiryProps) {
  if (on === null) return <span className="text-muted">{worded ? 'no expiry given' : 'none given'}</span>;
  if (on >= localToday())
    return (
      <>
        {worded ? <span className="text-muted">expires </span> : null}
        {formatDay(on)}
      </>
    );
  return <StateWord glyph="triangle" word={`expired ${formatDay(on)}`} />;
}
