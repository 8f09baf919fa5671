import { createRandom, seedOf } from '../photograph/random.ts';

export type PlannedStructure = {
  readonly structureNumber: string;
  readonly kind: 'set' | 'straighten' | 'relevel';
  readonly design: {
    readonly poleLengthFt: number | null;
    readonly poleClass: string | null;
    readonly poleMaterial: string | null;
    readonly ground: 'soil' | 'rock' | 'soil-over-rock' | null;
    readonly embedmentFt: number | null;
    readonly latitude: number;
    readonly longitude: number;
  };
};

export type StoryWorkOrder = {
  readonly number: string;
  readonly title: string;
  readonly contractor: 'brindle' | 'tamsett';
  readonly zone: string;
  readonly foreman: string;
  readonly planned: readonly PlannedStructure[];
};

type Line = {
  readonly prefix: string;
  readonly numbers: readonly [number, number];
  readonly start: { readonly latitude: number; readonly longitude: number };
  /** bearing of the line, degrees from north, and the span between poles */
  readonly bearingDeg: number;
  readonly spanFt: number;
};

const FT_PER_DEGREE = 364_567; // of latitude near 42° N, WGS 84, to the nearest foot

/** The work orders of the demo, with their design lists; open farmland, nobody's real line. */
export const WORK_ORDERS: readonly StoryWorkOrder[] = [
  {
    number: '17',
    title: 'Fallow Road tie line',
    contractor: 'brindle',
    zone: 'America/Chicago',
    foreman: 'T. Hallam',
    planned: [
      ...planLine({
        prefix: '17-',
        numbers: [401, 430],
        start: { latitude: 41.90412, longitude: -94.71836 },
        bearingDeg: 91.5,
        spanFt: 285,
      }),
      ...standing({
        prefix: '17-',
        numbers: [431, 434],
        start: { latitude: 41.91205, longitude: -94.72011 },
        bearingDeg: 2,
        spanFt: 310,
      }),
      ...pads({
        prefix: '17-',
        numbers: [440, 441],
        start: { latitude: 41.90398, longitude: -94.70442 },
        bearingDeg: 88,
        spanFt: 640,
      }),
    ],
  },
  {
    number: '18',
    title: 'Sandhill Lane rebuild',
    contractor: 'tamsett',
    zone: 'America/Chicago',
    foreman: 'G. Pruett',
    planned: planLine({
      prefix: '18-',
      numbers: [101, 124],
      start: { latitude: 41.86127, longitude: -94.66458 },
      bearingDeg: 356,
      spanFt: 300,
    }),
  },
];

/** New poles along a line: mostly 40 ft, taller at crossings, a steel one now and then, rock where the road cuts the ridge. */
function planLine(line: Line): PlannedStructure[] {
  return places(line).map(({ structureNumber, latitude, longitude }, n) => {
    const random = createRandom(seedOf(`design ${structureNumber}`));
    const steel = n % 13 === 9;
    const rock = n % 14 === 13;
    const poleLengthFt = steel ? 45 : random.pick([35, 40, 40, 40, 40, 45, 45, 50]);
    const poleClass = steel
      ? 'other'
      : poleLengthFt >= 45
        ? random.pick(['3', '4'])
        : random.pick(['4', '4', '5']);
    const poleMaterial = steel ? 'steel' : 'southern-pine';
    const ground = rock ? ('rock' as const) : ('soil' as const);
    const design = { poleLengthFt, poleClass, poleMaterial, ground, embedmentFt: null, latitude, longitude };
    return { structureNumber, kind: 'set', design };
  });
}

/** Poles that stand already and lean. */
function standing(line: Line): PlannedStructure[] {
  return places(line).map(({ structureNumber, latitude, longitude }) => {
    const design = {
      poleLengthFt: 40,
      poleClass: '4',
      poleMaterial: 'southern-pine',
      ground: 'soil' as const,
      embedmentFt: null,
      latitude,
      longitude,
    };
    return { structureNumber, kind: 'straighten', design };
  });
}

/** Pad-mounted enclosures that have settled. */
function pads(line: Line): PlannedStructure[] {
  return places(line).map(({ structureNumber, latitude, longitude }) => {
    const design = {
      poleLengthFt: null,
      poleClass: null,
      poleMaterial: null,
      ground: null,
      embedmentFt: null,
      latitude,
      longitude,
    };
    return { structureNumber, kind: 'relevel', design };
  });
}

function places({ prefix, numbers: [first, last], start, bearingDeg, spanFt }: Line) {
  return Array.from({ length: last - first + 1 }, (_, n) => {
    const bearing = (bearingDeg * Math.PI) / 180;
    const along = (n * spanFt) / FT_PER_DEGREE;
    const latitude = start.latitude + along * Math.cos(bearing);
    const longitude =
      start.longitude + (along * Math.sin(bearing)) / Math.cos((start.latitude * Math.PI) / 180);
    return {
      structureNumber: `${prefix}${String(first + n).padStart(4, '0')}`,
      latitude: sixPlaces(latitude),
      longitude: sixPlaces(longitude),
    };
  });
}

/** Degrees to six places, about four inches. */
export function sixPlaces(degrees: number): number {
  return Math.round(degrees * 1e6) / 1e6;
}

export function plannedStructure(structureNumber: string): PlannedStructure {
  const found = WORK_ORDERS.flatMap((order) => order.planned).find(
    (planned) => planned.structureNumber === structureNumber,
  );
  if (!found) throw new Error(`The story plans no structure ${structureNumber}.`);
  return found;
}
