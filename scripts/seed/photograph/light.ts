import type { Random } from './random.ts';

export type Soil = { ground: string; light: string; dark: string; wall: string; deep: string };

const SOILS: readonly Soil[] = [
  { ground: '#8a6f52', light: '#a58a6a', dark: '#6b533b', wall: '#6d5239', deep: '#1d150e' },
  { ground: '#7b6450', light: '#98806a', dark: '#5a4636', wall: '#5c4737', deep: '#17110c' },
  { ground: '#9c7f5c', light: '#b99d79', dark: '#7a6144', wall: '#806546', deep: '#241a10' },
  { ground: '#8e6247', light: '#ab7e60', dark: '#6c4630', wall: '#71492f', deep: '#1f120b' },
];

const SKIES = [
  { high: '#7fa6c9', low: '#d9e5ea', cloud: '#f4f6f5' },
  { high: '#9db4c4', low: '#e4e6e1', cloud: '#f1f0ec' },
  { high: '#6f9bc4', low: '#cfe0ec', cloud: '#ffffff' },
  { high: '#a7b3b8', low: '#dcdcd6', cloud: '#e9e8e4' },
] as const;

const GREENS = [
  ['#6f7f45', '#86954f', '#5b6b38', '#9aa35f', '#4d5c31'],
  ['#7c8450', '#97995c', '#67703f', '#b0ab72', '#565f36'],
  ['#5f7a45', '#759255', '#4d6537', '#8ea566', '#41562f'],
] as const;

export type Light = {
  soil: Soil;
  sky: (typeof SKIES)[number];
  greens: readonly string[];
  pole: { base: string; light: string; dark: string };
  /** Laid over the whole picture, as the hour of the day tints it. */
  tint: string;
  tintShare: number;
};

/** Soil and plants follow the structure (they are one place), sky and tint the photograph. */
export function chooseLight({ place, shot, hour }: { place: Random; shot: Random; hour: number }): Light {
  const late = Math.min(1, Math.abs(hour - 13) / 6);
  return {
    soil: place.pick(SOILS),
    greens: place.pick(GREENS),
    pole: place.pick([
      { base: '#7d6147', light: '#a48768', dark: '#4f3b2a' },
      { base: '#86725a', light: '#ad987c', dark: '#574836' },
      { base: '#6f6a4e', light: '#959069', dark: '#454230' },
    ]),
    sky: shot.pick(SKIES),
    tint: hour < 13 ? '#ffdca8' : '#ffc98f',
    tintShare: 0.04 + 0.12 * late,
  };
}
