/** The reader's own calendar day, `YYYY-MM-DD`: days of the work have no zone and are compared as text. */
export function localToday(): string {
  const now = new Date();
  const two = (part: number) => String(part).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
