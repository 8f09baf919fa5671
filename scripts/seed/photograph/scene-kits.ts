import type { Random } from './random.ts';
import type { Scene, Subject } from './scene.ts';
import { HEIGHT, WIDTH, numberCard, round } from './shapes.ts';
import { strokeText } from './stroke-text.ts';

type Box = { kitFt3: number; lot: string };

/** The packed kits on the truck's bed, labels to the front. */
export const drawKits: Scene = (subject, random, light) => {
  const boxes = subject.kits.flatMap(({ kitFt3, lot, quantity }) =>
    Array.from({ length: quantity }, () => ({ kitFt3, lot })),
  );
  const shown = boxes.slice(0, 5);
  const gap = 26;
  const widths = shown.map((box) => boxWidth(box, shown.length));
  const full = widths.reduce((sum, width) => sum + width, 0) + gap * (shown.length - 1);
  let x = (WIDTH - full) / 2 + random.between(-30, 30);
  const drawn = shown.map((box, n) => {
    const width = widths[n]!;
    const at = x;
    x += width + gap;
    return drawBox(box, { x: at, bottom: 930 + random.between(-26, 26), width, random });
  });
  return [
    bed(light.sky.low, random),
    ...drawn,
    numberCard(random, subject.structureNumber, { x: 1330, y: 1090 }),
  ].join('');
};

function boxWidth(box: Box, count: number): number {
  return Math.min(330, 1350 / count) * (0.78 + box.kitFt3 * 0.03);
}

function bed(glow: string, random: Random): string {
  const paint = random.pick(['#5c6f78', '#6d6a63', '#4f6156', '#7a5a48']);
  const ribs = Array.from({ length: 15 }, (_, n) => {
    const far = 140 + n * 94;
    const near = -420 + n * 174;
    return `<path d="M${far} 560L${near} ${HEIGHT}h60L${far + 30} 560Z" fill="#000" fill-opacity="0.16"/><path d="M${far + 30} 560L${near + 60} ${HEIGHT}h10L${far + 36} 560Z" fill="#fff" fill-opacity="0.12"/>`;
  }).join('');
  return `<linearGradient id="bed" x1="0" x2="0" y1="0" y2="1"><stop offset="0" stop-color="#4c5052"/><stop offset="1" stop-color="#8b8f90"/></linearGradient>
<linearGradient id="side" x1="0" x2="1" y1="0" y2="1"><stop offset="0" stop-color="${glow}" stop-opacity="0.4"/><stop offset="1" stop-color="#000" stop-opacity="0.25"/></linearGradient>
<rect width="${WIDTH}" height="570" fill="${paint}"/><rect width="${WIDTH}" height="570" fill="url(#side)"/>
<rect y="70" width="${WIDTH}" height="16" fill="#000" fill-opacity="0.25"/><rect y="86" width="${WIDTH}" height="6" fill="#fff" fill-opacity="0.22"/>
<rect y="430" width="${WIDTH}" height="12" fill="#000" fill-opacity="0.22"/>
<rect y="556" width="${WIDTH}" height="${HEIGHT - 556}" fill="url(#bed)"/>${ribs}<rect y="552" width="${WIDTH}" height="16" fill="#000" fill-opacity="0.4"/>`;
}

function drawBox(
  box: Box,
  { x, bottom, width, random }: { x: number; bottom: number; width: number; random: Random },
): string {
  const height = width * (1.02 + box.kitFt3 * 0.045);
  const top = bottom - height;
  const deep = width * 0.2;
  const card = random.pick(['#c3a377', '#b8986c', '#caac82']);
  const label = { x: x + width * 0.1, y: top + height * 0.2, width: width * 0.8, height: height * 0.56 };
  const text = (line: string, share: number, size: number): string =>
    strokeText(line, {
      x: label.x + label.width / 2,
      y: label.y + label.height * share,
      size: (size * label.width) / 260,
      colour: '#20262e',
      anchor: 'middle',
      weight: 0.15,
    });
  const bars = Array.from({ length: 24 }, (_, n) => {
    const left = label.x + label.width * (0.14 + n * 0.03);
    return random.chance(0.7)
      ? `<rect x="${round(left)}" y="${round(label.y + label.height * 0.83)}" width="${round(label.width * random.pick([0.01, 0.018]))}" height="${round(label.height * 0.11)}" fill="#20262e"/>`
      : '';
  }).join('');
  return `<path d="M${round(x + 20)} ${round(bottom)}h${round(width + deep * 0.6)}l90 70H${round(x + 120)}Z" fill="#000" fill-opacity="0.3"/>
<rect x="${round(x)}" y="${round(top)}" width="${round(width)}" height="${round(height)}" fill="${card}"/>
<path d="M${round(x)} ${round(top)}l${round(deep)} ${round(-deep * 0.8)}h${round(width - deep * 0.7)}l${round(-deep * 0.3)} ${round(deep * 0.8)}Z" fill="#e0c69d"/>
<path d="M${round(x + width * 0.44)} ${round(top)}l${round(deep * 0.4)} ${round(-deep * 0.8)}h${round(width * 0.1)}l${round(-deep * 0.2)} ${round(deep * 0.8)}v${round(height * 0.15)}h${round(-width * 0.12)}Z" fill="#d8cdb4" fill-opacity="0.85"/>
<path d="M${round(x + width)} ${round(top)}v${round(height)}" stroke="#000" stroke-width="5" stroke-opacity="0.3"/>
<path d="M${round(x)} ${round(top)}h${round(width)}" stroke="#000" stroke-width="3" stroke-opacity="0.25"/>
<rect x="${round(label.x)}" y="${round(label.y)}" width="${round(label.width)}" height="${round(label.height)}" fill="#f4f1e6"/>
<rect x="${round(label.x)}" y="${round(label.y)}" width="${round(label.width)}" height="${round(label.height * 0.21)}" fill="#e6d28d"/>
${text('EP-15', 0.05, 34)}${text(`${box.kitFt3} CU FT`, 0.29, 25)}${text('LOT', 0.49, 16)}${text(box.lot, 0.62, 30)}${bars}`;
}

/** How many boxes a photograph of these kits shows. */
export function boxCount(subject: Subject): number {
  return Math.min(
    5,
    subject.kits.reduce((sum, kit) => sum + kit.quantity, 0),
  );
}
