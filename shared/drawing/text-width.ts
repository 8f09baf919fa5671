/**
 * Advance widths of Noto Sans in thousandths of an em, regular and semibold: the printable ASCII letters in order, then
 * what else the trade writes. Source: the `hmtx` tables of the font files that a PDF carries; a test compares them.
 */
const ASCII: Readonly<Record<'regular' | 'semibold', readonly number[]>> = {
  // prettier-ignore
  regular: [260,269,408,646,572,831,732,225,300,300,551,572,268,322,268,372,572,572,572,572,572,572,572,572,572,572,268,268,572,572,572,434,899,639,650,632,730,556,519,728,741,339,273,619,524,907,760,781,605,781,622,549,556,731,600,930,586,566,572,329,372,329,572,444,281,561,615,480,615,564,344,615,618,258,258,534,258,935,618,605,615,615,413,479,361,618,508,786,529,510,470,380,551,380,572],
  // prettier-ignore
  semibold: [260,277,452,646,572,875,743,250,324,324,546,572,279,320,276,399,572,572,572,572,572,572,572,572,572,572,276,279,572,572,572,461,898,672,659,638,732,558,538,726,756,370,309,647,546,929,793,787,615,787,643,550,569,747,631,953,638,603,576,330,399,330,572,423,333,585,626,502,626,585,371,626,638,283,283,588,283,960,638,617,626,626,434,493,406,638,547,830,560,548,484,389,551,389,572],
};
const OTHERS: Readonly<Record<string, readonly [regular: number, semibold: number]>> = {
  '\u00a0': [260, 260],
  '°': [428, 426],
  '±': [572, 572],
  '²': [350, 368],
  '³': [350, 369],
  '·': [268, 276],
  '×': [572, 572],
  '½': [771, 835],
  '–': [500, 500],
  '—': [1000, 1000],
  '‘': [175, 201],
  '’': [175, 201],
  '“': [359, 413],
  '”': [359, 413],
  '…': [791, 831],
  '−': [572, 577],
};

/** Thousandths of an em. A letter that is not known is taken as wide, so that what is reserved is never too small. */
function advance(letter: string, bold: boolean): number {
  const code = letter.codePointAt(0) ?? 0;
  const width = ASCII[bold ? 'semibold' : 'regular'][code - 32] ?? OTHERS[letter]?.[bold ? 1 : 0];
  return width ?? (code > 0x2e7f ? 1000 : 680);
}

/** Width of a text in the units of `size`. */
export function textWidth(text: string, size: number, bold = false): number {
  let width = 0;
  for (const letter of text) width += advance(letter, bold);
  return (width * size) / 1000;
}

type Room = { readonly width: number; readonly size: number; readonly bold?: boolean };

/** Breaks at spaces so that each line fits; a single word longer than the line is cut. At most `most` lines, the last one cut with an ellipsis. */
export function wrapText(
  text: string,
  { width, size, bold = false, most = 3 }: Room & { readonly most?: number },
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
  const kept = lines.length <= most ? lines : [...lines.slice(0, most - 1), lines.slice(most - 1).join(' ')];
  return kept.map((one) => fitText(one, { width, size, bold }));
}

/** The text, cut with an ellipsis where it is too wide. */
export function fitText(text: string, { width, size, bold = false }: Room): string {
  if (textWidth(text, size, bold) <= width) return text;
  const letters = Array.from(text);
  while (letters.length > 1 && textWidth(`${letters.join('')}…`, size, bold) > width) letters.pop();
  return `${letters.join('').trimEnd()}…`;
}
