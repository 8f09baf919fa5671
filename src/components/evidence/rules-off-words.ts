import type { BatchRevision } from '#shared/generated/api-types.ts';

/** Titles of rules that are off, with the versions where others have them on; at most so many by name. */
export function rulesOffWords(off: BatchRevision['rulesOff'], most: number): string {
  const named = off
    .slice(0, most)
    .map(({ title, standards }) =>
      standards === null ? title : `${title} (standard ${standards.join(' and ')} only)`,
    );
  const more = off.length - named.length;
  return more > 0 ? `${named.join(', ')} and ${more} more` : named.join(', ');
}
