import type { Scene } from './scene.ts';
import { field } from './scene-field.ts';
import { numberCard, round } from './shapes.ts';
import { strokeText } from './stroke-text.ts';

/** A pad-mounted enclosure: tipped before, its gap measured, level after. */
export const drawPad: Scene = (subject, random, light) => {
  const x = 800 + random.between(-70, 70);
  const tilt =
    subject.view === 'before'
      ? -3 - subject.leanDeg
      : subject.view === 'gap'
        ? -0.6
        : random.between(-0.3, 0.3);
  const paint = random.pick(['#4f6b56', '#5d6b62', '#56685c']);
  const filled = subject.view === 'level-after';
  const base = filled ? '#dcc678' : light.soil.deep;
  return [
    field(random, light, 520),
    `<path d="M${round(x - 470)} 1010h940l60 60H${round(x - 530)}Z" fill="#000" fill-opacity="0.35"/>`,
    `<path d="M${round(x - 440)} 950H${round(x + 440)}V1030H${round(x - 440)}Z" fill="${base}"/>`,
    `<g transform="rotate(${round(tilt)} ${round(x + 430)} 950)">
<rect x="${round(x - 450)}" y="880" width="900" height="80" fill="#b6b3a9"/><rect x="${round(x - 450)}" y="880" width="900" height="14" fill="#fff" fill-opacity="0.35"/>
<rect x="${round(x - 390)}" y="360" width="780" height="520" fill="${paint}"/><path d="M${round(x - 390)} 360l50 -60h720l10 60Z" fill="${paint}"/><path d="M${round(x - 390)} 360l50 -60h720l10 60Z" fill="#fff" fill-opacity="0.18"/>
<path d="M${round(x)} 372v496M${round(x - 380)} 372h760v496h-760Z" stroke="#000" stroke-width="5" stroke-opacity="0.35" fill="none"/>
<rect x="${round(x + 16)}" y="590" width="26" height="90" rx="8" fill="#20241f"/><rect x="${round(x - 300)}" y="450" width="190" height="130" fill="#e8c62f"/>
<path d="M${round(x - 205)} 468l58 96h-116Z" fill="none" stroke="#1f1c14" stroke-width="8"/>
${filled ? spirit(x) : ''}</g>`,
    subject.view === 'gap' ? stick(x - 360, subject.gapIn) : '',
    numberCard(random, subject.structureNumber, { x: x + 400, y: 1110 }),
  ].join('');
};

function spirit(x: number): string {
  return `<rect x="${round(x - 260)}" y="252" width="520" height="48" rx="6" fill="#c0472c"/><rect x="${round(x - 48)}" y="260" width="96" height="32" rx="8" fill="#2b2b28"/><rect x="${round(x - 40)}" y="264" width="80" height="24" rx="12" fill="#c9dd62"/><ellipse cx="${round(x)}" cy="276" rx="14" ry="9" fill="#f3f8d5"/><path d="M${round(x - 17)} 264v24M${round(x + 17)} 264v24" stroke="#2b2b28" stroke-width="3"/>`;
}

function stick(x: number, gapIn: number): string {
  const ticks = Array.from(
    { length: 14 },
    (_, n) =>
      `<path d="M${round(x)} ${820 + n * 16}h${n % 4 === 0 ? 34 : 18}" stroke="#1f1c14" stroke-width="3"/>`,
  ).join('');
  return `<rect x="${round(x)}" y="800" width="70" height="240" fill="#f2c51d"/>${ticks}<rect x="${round(x - 20)}" y="690" width="220" height="90" rx="6" fill="#f7d64a" stroke="#7d6410" stroke-width="3"/>${strokeText(`${gapIn}"`, { x: x + 4, y: 708, size: 54, colour: '#1f1c14' })}`;
}
