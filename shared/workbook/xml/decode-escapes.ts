const ESCAPE = /_x([0-9A-Fa-f]{4})_/g;

/** `_xHHHH_` to its character, once: `_x005F_x000D_` is the text `_x000D_` (ECMA-376 Part 1, 22.9.2.19 ST_Xstring). */
export function decodeEscapes(text: string): string {
  if (!text.includes('_x')) return text;
  return text.replace(ESCAPE, (_, hex: string) => String.fromCharCode(Number.parseInt(hex, 16)));
}
