/** Strokes on a grid 4 wide and 6 high, y down: a machine without any font draws the same letters. */
const GLYPHS: Readonly<Record<string, string>> = {
  '0': '10 30 41 45 36 16 05 01 10',
  '1': '11 20 26|16 36',
  '2': '01 10 30 41 42 06 46',
  '3': '01 10 30 41 42 33 13|33 44 45 36 16 05',
  '4': '30 04 44|36 30',
  '5': '40 00 03 33 44 45 36 06',
  '6': '40 10 01 05 16 36 45 44 33 03',
  '7': '00 40 16',
  '8': '10 30 41 42 33 13 02 01 10|13 04 05 16 36 45 44 33',
  '9': '06 36 45 41 30 10 01 02 13 43',
  A: '06 20 46|14 34',
  B: '00 06 36 45 44 33 03|00 30 41 42 33',
  C: '41 30 10 01 05 16 36 45',
  D: '00 06 26 44 42 20 00',
  E: '40 00 06 46|03 33',
  F: '40 00 06|03 33',
  G: '41 30 10 01 05 16 36 45 43 23',
  H: '00 06|40 46|03 43',
  I: '10 30|20 26|16 36',
  J: '40 45 36 16 05',
  K: '00 06|40 03 46',
  L: '00 06 46',
  M: '06 00 23 40 46',
  N: '06 00 46 40',
  O: '10 30 41 45 36 16 05 01 10',
  P: '06 00 30 41 42 33 03',
  Q: '10 30 41 45 36 16 05 01 10|24 46',
  R: '06 00 30 41 42 33 03|23 46',
  S: '41 30 10 01 02 13 33 44 45 36 16 05',
  T: '00 40|20 26',
  U: '00 05 16 36 45 40',
  V: '00 26 40',
  W: '00 16 23 36 40',
  X: '00 46|40 06',
  Y: '00 23 40|23 26',
  Z: '00 40 06 46',
  '-': '13 33',
  '.': '26 25',
  '/': '06 40',
  ':': '21 22|25 26',
  "'": '20 22',
  '"': '10 12|30 32',
};

export type TextStyle = {
  x: number;
  y: number;
  /** height of a capital, pixels */
  size: number;
  colour: string;
  weight?: number;
  anchor?: 'start' | 'middle';
};

/** Draws a line of capitals, digits and a few marks as SVG strokes; other characters leave a blank. */
export function strokeText(
  text: string,
  { x, y, size, colour, weight = 0.16, anchor = 'start' }: TextStyle,
): string {
  const unit = size / 6;
  const advance = unit * 5.6;
  const left = anchor === 'middle' ? x - (advance * text.length - unit * 1.6) / 2 : x;
  const path = Array.from(text.toUpperCase())
    .flatMap((char, n) =>
      (GLYPHS[char] ?? '').split('|').map((stroke) => polyline(stroke, left + n * advance, y, unit)),
    )
    .join('');
  return `<path d="${path}" fill="none" stroke="${colour}" stroke-width="${(size * weight).toFixed(1)}" stroke-linecap="round" stroke-linejoin="round"/>`;
}

function polyline(stroke: string, left: number, top: number, unit: number): string {
  if (stroke === '') return '';
  const points = stroke.split(' ').map((point) => {
    const px = left + Number(point[0]) * unit;
    const py = top + Number(point[1]) * unit;
    return `${px.toFixed(1)} ${py.toFixed(1)}`;
  });
  return `M${points.join('L')}`;
}
