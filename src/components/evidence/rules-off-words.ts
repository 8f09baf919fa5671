import type { BatchRevision } from '#shared/generated/api-types.ts';

/** Titles of rules that are off, with the versions where others have them on. */
export function rulesOffWords(off: BatchRevision['rulesOff']): string {
  return off
    .map(({ title, standards }) =>
      standards === null ? title : `${title} (standard ${standards.join(' and ')} only)`,
    )
    .join(', ');
}
