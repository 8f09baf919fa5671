import { describe, expect, it } from 'vitest';
import { DEMO_PRODUCT } from '#shared/standard/demo.ts';
import { strengthAt, type PourAt } from './strength-at.ts';

const MINUTE = 60_000;
const pour = (changed: Partial<PourAt> = {}): PourAt => ({
  event: 1,
  pourNumber: 1,
  atMs: 0,
  componentATempF: 72,
  componentBTempF: 70,
  ...changed,
});
const at = (minutes: number, event = 1) => ({ event, field: 'hardwareAt', atMs: minutes * MINUTE });
const shares = (pours: readonly PourAt[], ...done: ReturnType<typeof at>[]) =>
  strengthAt(done, { pours, product: DEMO_PRODUCT }).map(({ minutes, tempF, share }) => [
    minutes,
    tempF,
    Number(share.toFixed(4)),
  ]);

describe('strength when something was done', () => {
  it('reads half after 3 min, 0.66 at 15 min, 0.8 after an hour', () => {
    // 0.5 + 0.3 · ln 5 / ln 20 = 0.6612.
    expect(shares([pour()], at(3), at(15), at(60))).toEqual([
      [3, 70, 0.5],
      [15, 70, 0.6612],
      [60, 70, 0.8],
    ]);
  });

  it('counts from the last pour, by the coldest component of that pour alone', () => {
    // At 40 °F everything takes twice as long: 30 min read as 15 do.
    const lift = pour({ pourNumber: 2, atMs: 10 * MINUTE, componentBTempF: 40 });
    expect(shares([pour(), lift], at(40))).toEqual([[30, 40, 0.6612]]);
    expect(shares([lift, pour()], at(40))).toEqual([[30, 40, 0.6612]]);
    const other = pour({ pourNumber: 2, atMs: 10 * MINUTE, componentATempF: 65 });
    expect(shares([lift, other], at(40))).toEqual([[30, 40, 0.6612]]);
  });

  it('counts of two pours at one time the one of the higher number, in whatever order they come', () => {
    // At 40 °F everything takes twice as long: 30 min read as 15 do.
    const second = pour({ pourNumber: 2, componentBTempF: 40 });
    expect(shares([pour(), second], at(30))).toEqual([[30, 40, 0.6612]]);
    expect(shares([second, pour()], at(30))).toEqual([[30, 40, 0.6612]]);
  });

  it('keeps each event’s own clock', () => {
    const later = pour({ event: 2, atMs: 1000 * MINUTE });
    expect(shares([pour(), later], at(15), at(1015, 2), at(15, 3))).toEqual([
      [15, 70, 0.6612],
      [15, 70, 0.6612],
    ]);
  });

  it('is none before the pour, and nothing where a time or a temperature is not known', () => {
    expect(shares([pour()], at(-5))).toEqual([[-5, 70, 0]]);
    expect(shares([pour({ atMs: null })], at(15))).toEqual([]);
    expect(shares([pour({ componentATempF: null })], at(15))).toEqual([]);
    expect(shares([], at(15))).toEqual([]);
  });
});
