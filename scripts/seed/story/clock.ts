/** Wall-clock arithmetic on `YYYY-MM-DDTHH:mm`, within one day and no change of the clocks: all that the story needs. */
export function after(wall: string, minutes: number): string {
  const [day, time] = wall.split('T');
  const [hours = 0, mins = 0] = (time ?? '').split(':').map(Number);
  const total = hours * 60 + mins + minutes;
  if (!day || total < 0 || total >= 1440) throw new Error(`${wall} and ${minutes} minutes leave the day.`);
  return `${day}T${two(Math.floor(total / 60))}:${two(total % 60)}`;
}

function two(value: number): string {
  return String(value).padStart(2, '0');
}
