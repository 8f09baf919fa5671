/** The calendar day (`YYYY-MM-DD`) some days after the reader's own today. */
export function dayFrom(now: Date, days: number): string {
  const day = new Date(now.getFullYear(), now.getMonth(), now.getDate() + days);
  const two = (part: number) => String(part).padStart(2, '0');
  return `${day.getFullYear()}-${two(day.getMonth() + 1)}-${two(day.getDate())}`;
}
