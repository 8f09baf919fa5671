import { classTableOf } from '#shared/calc/class-table.ts';
import { deriveRelevel } from '#shared/calc/derive-relevel.ts';
import { deriveSet } from '#shared/calc/derive-set.ts';
import { deriveStraighten } from '#shared/calc/derive-straighten.ts';
import { dueDepthFt } from '#shared/calc/due-depth.ts';
import { planKits } from '#shared/calc/kit-plan.ts';
import { tableGirthAt } from '#shared/calc/pole-sizes.ts';
import type { FieldValues, Kind, Scalar } from '#shared/records/types.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import type { Random } from '../photograph/random.ts';
import { after } from './clock.ts';
import { type PlannedStructure, sixPlaces } from './work-orders.ts';

export type Values = Record<string, Scalar>;

/** A pole set as it should be: every rule of the demo standard is met. `boredAt` is wall clock. */
export function soundSetValues(
  planned: PlannedStructure,
  { random, boredAt, foreman }: { random: Random; boredAt: string; foreman: string },
): Values {
  const { ground, poleLengthFt, poleClass, poleMaterial } = planned.design;
  const pole: Values = { poleLengthFt, poleClass, poleMaterial };
  const due =
    dueDepthFt({
      values: { ...pole, ground, boreTopIn: 18 },
      standard: DEMO_STANDARD,
      designEmbedmentFt: null,
    }) ?? 6;
  const embedmentFt = tenth(due + random.between(0.1, 0.4));
  Object.assign(pole, tapedSizes(pole, embedmentFt, random));
  const boreTopIn = half(
    Number(pole['diameterGroundLineIn'] ?? Number(pole['girthGroundLineIn']) / Math.PI) +
      random.between(6.2, 7.6),
  );
  const leanInPer10Ft = tenth(random.between(0, 0.6));
  const setAt = after(boredAt, random.whole(18, 34));
  const pouredAt = after(setAt, random.whole(4, 9));
  const hardwareAt = after(pouredAt, random.whole(19, 38));
  return {
    structureNumber: planned.structureNumber,
    ...pole,
    structureUse: 'tangent',
    boreTopIn,
    boreBottomIn: boreTopIn - random.pick([0, 0.5, 1]),
    boreDepthFt: tenth(embedmentFt + random.pick([0, 0.1, 0.2])),
    casing: 'none',
    ground,
    embedmentFt,
    foamTopBelowGradeIn: random.pick([0, 0, -0.5, -1]),
    waterIn: random.chance(0.6) ? 0 : tenth(random.between(0.2, 0.8)),
    leanInPer10Ft,
    ...(leanInPer10Ft > 0.25 ? { leanAzimuthDeg: random.whole(0, 71) * 5 } : {}),
    boredAt,
    setAt,
    letGoAt: after(pouredAt, random.whole(5, 8)),
    hardwareAt,
    loadAt: random.chance(0.5) ? 'not-yet' : after(pouredAt, random.whole(75, 140)),
    ...placeValues(planned, { random, openedAt: boredAt }),
    foreman,
  };
}

/** Where it stands, and the locate ticket that was valid when the ground was opened. */
export function placeValues(
  { structureNumber, design }: PlannedStructure,
  { random, openedAt }: { random: Random; openedAt: string },
): Values {
  return {
    latitude: sixPlaces(design.latitude + random.between(-1, 1) * 0.000012),
    longitude: sixPlaces(design.longitude + random.between(-1, 1) * 0.000012),
    accuracyFt: random.pick([2, 3, 3, 5]),
    locateTicket: `LT-26-${structureNumber.slice(-4)}`,
    locateFrom: dayBefore(openedAt, 4),
    locateTo: dayBefore(openedAt, -10),
  };
}

export type PourValues = Values & { kitFt3: number; quantity: number };

const DERIVE = { set: deriveSet, straighten: deriveStraighten, relevel: deriveRelevel };

/** Kits that cover the void with the standard's allowance, one row a size, poured at one time. */
export function soundPours(
  values: FieldValues,
  { kind, random, lot, pouredAt }: { kind: Kind; random: Random; lot: string; pouredAt: string },
): PourValues[] {
  const { voidFt3 } = DERIVE[kind]({ values, pours: [], standard: DEMO_STANDARD, product: DEMO_PRODUCT });
  const plan =
    voidFt3 === null
      ? null
      : planKits({ voidFt3, tempF: 65, product: DEMO_PRODUCT, standard: DEMO_STANDARD });
  if (!plan || plan.kits.length === 0)
    throw new Error(`No kits fit structure ${String(values['structureNumber'])}.`);
  const warm = {
    componentATempF: random.whole(64, 76),
    componentBTempF: random.whole(64, 76),
    airTempF: random.whole(48, 71),
  };
  return [...new Set(plan.kits)].map((kitFt3) => ({
    structureNumber: values['structureNumber'] ?? null,
    pourNumber: 1,
    pouredAt,
    product: DEMO_PRODUCT.code,
    lot,
    kitFt3,
    quantity: plan.kits.filter((size) => size === kitFt3).length,
    ...warm,
  }));
}

/** Wood is taped a little over its class's least girth; steel is measured across flats. */
function tapedSizes(pole: FieldValues, embedmentFt: number, random: Random): Values {
  const length = Number(pole['poleLengthFt']);
  const entry = classTableOf(pole);
  if (!entry)
    return {
      poleSection: 'dodecagonal',
      buttEnd: 'plated',
      diameterGroundLineIn: 11.5,
      diameterButtIn: 12.4,
    };
  const over = random.between(1.01, 1.05);
  return {
    girthGroundLineIn: quarter(tableGirthAt(entry, length, embedmentFt) * over),
    girthButtIn: quarter(tableGirthAt(entry, length, 0) * over),
  };
}

function dayBefore(wall: string, days: number): string {
  const at = new Date(`${wall.slice(0, 10)}T12:00:00Z`);
  at.setUTCDate(at.getUTCDate() - days);
  return at.toISOString().slice(0, 10);
}

export function tenth(value: number): number {
  return Math.round(value * 10) / 10;
}

function quarter(value: number): number {
  return Math.round(value * 4) / 4;
}

function half(value: number): number {
  return Math.round(value * 2) / 2;
}
