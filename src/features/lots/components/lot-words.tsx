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

export function Expiry({ on }: { on: string | null }) {
  if (on === null) return <span className="text-muted">none given</span>;
  if (on >= localToday()) return <>{formatDay(on)}</>;
  return <StateWord glyph="triangle" word={`expired ${formatDay(on)}`} />;
}
