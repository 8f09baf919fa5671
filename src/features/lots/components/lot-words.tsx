import { StateWord } from '#src/components/ui/state-word.tsx';
import { formatDay } from '#src/lib/formats.ts';
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

/** The reader's own calendar day: an expiry is a day, not an instant. */
export function today(): string {
  const now = new Date();
  const two = (part: number) => String(part).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}

export function Expiry({ on }: { on: string | null }) {
  if (on === null) return <span className="text-muted">none given</span>;
  if (on >= today()) return <>{formatDay(on)}</>;
  return <StateWord glyph="triangle" word={`expired ${formatDay(on)}`} />;
}
