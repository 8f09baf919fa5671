/** Where a structure of the tests stands: one place a number, each far enough from the others, in open country. */
export function placeOf(structureNumber: string): { latitude: number; longitude: number } {
  let hash = 0;
  for (const letter of structureNumber.trim().toUpperCase())
    hash = (hash * 31 + letter.charCodeAt(0)) % 1_000_003;
  // A thousandth of a degree is some 300 ft.
  const round = (degrees: number) => Math.round(degrees * 1000) / 1000;
  return {
    latitude: round(41.25 + (hash % 1000) / 1000),
    longitude: round(-97.5 + Math.floor(hash / 1000) / 1000),
  };
}
