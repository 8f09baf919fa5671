import type { Light } from './light.ts';
import type { Random } from './random.ts';
import { HEIGHT, WIDTH, grass, round } from './shapes.ts';

/** Sky, clouds, a low ridge and a field in rows: open country that is nowhere. */
export function field(random: Random, light: Light, horizon: number): string {
  const clouds = Array.from({ length: random.whole(2, 5) }, () => cloud(random, light, horizon)).join('');
  const ridge = Array.from(
    { length: 9 },
    (_, n) => `L${n * 200} ${round(horizon - random.between(4, 34))}`,
  ).join('');
  const vanish = WIDTH / 2 + random.between(-300, 300);
  const rows = Array.from({ length: 26 }, (_, n) => {
    const foot = -1400 + n * 176;
    return `<path d="M${round(vanish + (foot - vanish) * 0.06)} ${horizon}L${foot} ${HEIGHT}h52L${round(vanish + (foot - vanish) * 0.06 + 2)} ${horizon}Z" fill="#000" fill-opacity="0.09"/>`;
  }).join('');
  const near = (r: Random) => ({ x: r.between(-20, WIDTH + 20), y: r.between(horizon + 60, HEIGHT + 60) });
  return `<linearGradient id="sky" x1="0" x2="0" y1="0" y2="1"><stop offset="0" stop-color="${light.sky.high}"/><stop offset="1" stop-color="${light.sky.low}"/></linearGradient>
<linearGradient id="field" x1="0" x2="0" y1="0" y2="1"><stop offset="0" stop-color="${light.greens[3]}"/><stop offset="1" stop-color="${light.greens[2]}"/></linearGradient>
<rect width="${WIDTH}" height="${horizon + 4}" fill="url(#sky)"/>${clouds}
<path d="M0 ${horizon}${ridge}L${WIDTH} ${horizon}Z" fill="${light.greens[4]}" fill-opacity="0.62"/>
<rect y="${horizon}" width="${WIDTH}" height="${HEIGHT - horizon}" fill="url(#field)"/>${rows}
${grass(random, { count: 900, colours: light.greens, area: near, length: 62 })}`;
}

function cloud(random: Random, light: Light, horizon: number): string {
  const x = random.between(0, WIDTH);
  const y = random.between(40, horizon * 0.7);
  const wide = random.between(120, 300);
  return Array.from({ length: 7 }, () => {
    const dx = random.between(-wide, wide);
    const rx = random.between(0.3, 0.6) * wide;
    return `<ellipse cx="${round(x + dx)}" cy="${round(y + random.between(-12, 12))}" rx="${round(rx)}" ry="${round(rx * 0.18)}" fill="${light.sky.cloud}" fill-opacity="0.28"/>`;
  }).join('');
}

/** A pole with its grain; `lean` tips it about its foot, in degrees. */
export function pole(
  random: Random,
  light: Light,
  at: { x: number; foot: number; top: number; wide: number; lean: number },
): string {
  const { x, foot, top, wide, lean } = at;
  const half = wide / 2;
  const thin = half * 0.82;
  const id = `pole${Math.round(x)}`;
  const grain = Array.from({ length: 46 }, () => {
    const from = random.between(-half * 0.9, half * 0.9);
    const y = random.between(top, foot);
    return `<path d="M${round(x + from)} ${round(y)}l${round(random.between(-3, 3))} ${round(random.between(50, 300))}" stroke="${random.pick([light.pole.dark, light.pole.light])}" stroke-width="${round(random.between(1, wide / 60 + 1.5))}" stroke-opacity="0.35"/>`;
  }).join('');
  const body = `M${round(x - half)} ${foot}L${round(x - thin)} ${top}H${round(x + thin)}L${round(x + half)} ${foot}Z`;
  return `<linearGradient id="${id}" x1="0" x2="1"><stop offset="0" stop-color="${light.pole.dark}"/><stop offset="0.32" stop-color="${light.pole.light}"/><stop offset="0.6" stop-color="${light.pole.base}"/><stop offset="1" stop-color="${light.pole.dark}"/></linearGradient>
<clipPath id="${id}c"><path d="${body}"/></clipPath>
<g transform="rotate(${round(lean)} ${round(x)} ${foot})"><path d="${body}" fill="url(#${id})"/><g clip-path="url(#${id}c)">${grain}</g></g>`;
}
