import type { RecordRow } from '#shared/generated/api-types.ts';

const KIND_WORDS = { set: 'set', straighten: 'straighten', relevel: 're-level' } as const;

/** `40 ft cl 4, set`: what the line is, in the words of the list. */
export function describeLine({ kind, values, occurrence }: RecordRow): string {
  const again = occurrence > 1 ? `, entry ${occurrence}` : '';
  if (kind === 'relevel') {
    const { padLengthIn: length, padWidthIn: width } = values;
    const pad = typeof length === 'number' && typeof width === 'number' ? `, ${length} × ${width} in` : '';
    return `${KIND_WORDS[kind]}${pad}${again}`;
  }
  const { poleLengthFt, poleClass } = values;
  const pole = [typeof poleLengthFt === 'number' ? `${poleLengthFt} ft` : '', classWord(poleClass)]
    .filter(Boolean)
    .join(' ');
  return `${pole ? `${pole}, ` : ''}${KIND_WORDS[kind]}${again}`;
}

function classWord(poleClass: unknown): string {
  if (poleClass === 'other') return 'other class';
  return typeof poleClass === 'string' || typeof poleClass === 'number' ? `cl ${poleClass}` : '';
}
