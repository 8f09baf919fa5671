const HOUR_MS = 3_600_000;

/** How long something has waited, as people say it: `under an hour`, `5 hours`, `3 days`. */
export function ageWords(since: string, now: Date): string {
  const hours = Math.floor((now.getTime() - new Date(since).getTime()) / HOUR_MS);
  if (!Number.isFinite(hours)) return 'not known';
  if (hours < 1) return 'under an hour';
  if (hours < 48) return hours === 1 ? '1 hour' : `${hours} hours`;
  return `${Math.floor(hours / 24)} days`;
}
