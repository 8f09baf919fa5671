import { useState } from 'react';
import { formatInstant } from '#src/lib/formats.ts';

const HOUR = 3_600_000;
const DAY = 24 * HOUR;

/** How long ago, in the largest unit that is whole: `3 d`; the moment itself on hover and to assistive technology. */
export function Age({ since }: { since: string }) {
  const [now] = useState(() => Date.now());
  const ms = now - Date.parse(since);
  return (
    <time dateTime={since} title={formatInstant(since)}>
      {ageWords(ms)}
    </time>
  );
}

export function ageWords(ms: number): string {
  if (ms >= DAY) return `${Math.floor(ms / DAY)} d`;
  if (ms >= HOUR) return `${Math.floor(ms / HOUR)} h`;
  return ms >= 60_000 ? `${Math.floor(ms / 60_000)} min` : 'just now';
}
