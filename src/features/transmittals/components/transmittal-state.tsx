import { StateWord } from '#src/components/ui/state-word.tsx';
import type { Transmittal } from '#shared/generated/api-types.ts';

const WORDS = {
  queued: { glyph: 'dotted', word: 'waits to be written' },
  running: { glyph: 'dotted', word: 'being written' },
  issued: { glyph: 'tick', word: 'issued' },
  failed: { glyph: 'triangle', word: 'failed' },
} as const;

export function TransmittalState({ state }: { state: Transmittal['state'] }) {
  return <StateWord {...WORDS[state]} />;
}
