/** Advance widths of Noto Sans in em, by kind of letter; a little generous, so that what is reserved is never too small. */
function advance(letter: string): number {
  if (/[ilj.,:;'’|!()[\]]/.test(letter)) return 0.3;
  if (/[ \u00a0]/.test(letter)) return 0.27;
  if (/[tfr\-–°²³/]/.test(letter)) return 0.43;
  if (/[mwMW]/.test(letter)) return 0.93;
  if (/[A-Z±×−]/.test(letter)) return 0.67;
  return 0.59;
}

/** Width of a text in the units of `size`. Bold is about 6 % wider. */
export function textWidth(text: string, size: number, bold = false): number {
  let width = 0;
  for (const letter of text) width += advance(letter);
  return width * size * (bold ? 1.06 : 1);
}

/** Breaks at spaces so that each line fits; a single word longer than the line stays whole. At most `most` lines, the last one cut with an ellipsis. */
export function wrapText(
  text: string,
  { width, size, bold = false, most = 3 }: { width: number; size: number; bold?: boolean; most?: number },
): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && textWidth(longer, size, bold) > width) {
      lines.push(line);
      line = word;
    } else {
      line = longer;
    }
  }
  if (line !== '') lines.push(line);
  if (lines.length <= most) return lines;
  return [...lines.slice(0, most - 1), fitText(lines.slice(most - 1).join(' '), { width, size, bold })];
}

/** The text, cut with an ellipsis where it is too wide. */
export function fitText(
  text: string,
  { width, size, bold = false }: { width: number; size: number; bold?: boolean },
): string {
  if (textWidth(text, size, bold) <= width) return text;
  let cut = text;
  while (cut.length > 1 && textWidth(`${cut}…`, size, bold) > width) cut = cut.slice(0, -1);
  return `${cut.trimEnd()}…`;
}
