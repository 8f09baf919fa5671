import { batchOf, CLEAN_LINES, CLEAN_POURS } from '#shared/check/testing.ts';
import { FULL_CONTEXT } from '#shared/check/full-context.ts';
import type { FieldValues, Kind, SourceBatch } from '#shared/records/types.ts';
import type { CheckContext, DesignFact, PhotoFact } from '#shared/rules/types.ts';

/** Eight poles set for each one straightened and each pad raised. Invented. */
const KIND_OF_TEN: readonly Kind[] = [
  'set',
  'set',
  'set',
  'set',
  'straighten',
  'set',
  'set',
  'set',
  'set',
  'relevel',
];

const kindOf = (index: number): Kind => KIND_OF_TEN[index % KIND_OF_TEN.length] ?? 'set';
const nameOf = (index: number): string => `B-${String(index + 1).padStart(6, '0')}`;
/** Structures stand some 365 ft apart, in rows of a hundred. */
const placeOf = (index: number) => ({
  latitude: 35.1 + Math.floor(index / 100) / 1000,
  longitude: -97.4 + (index % 100) / 1000,
});

/** The clean line of each kind; each tenth pole set is half a foot short, each fifteenth line short of foam. */
const lineValues = (index: number): FieldValues => ({
  ...CLEAN_LINES[kindOf(index)],
  structureNumber: nameOf(index),
  ...placeOf(index),
  ...(kindOf(index) === 'set' && index % 10 === 0 ? { embedmentFt: 5.5 } : {}),
});
const pourValues = (index: number): readonly FieldValues[] =>
  CLEAN_POURS[kindOf(index)]
    .map((pour) => ({ ...pour, structureNumber: nameOf(index) }))
    .slice(0, index % 15 === 0 ? 1 : undefined);

const upTo = (lines: number): readonly number[] => Array.from({ length: lines }, (_, index) => index);

/** A batch of so many lines as the reader hands it on. */
export const manyLines = (lines: number): SourceBatch =>
  batchOf({
    lines: upTo(lines).map((index) => ({ kind: kindOf(index), values: lineValues(index) })),
    pours: upTo(lines).flatMap(pourValues),
  });

/** All that the product would know of that batch: design, lots, register, neighbours, every required photograph. */
export const contextOfMany = (lines: number): CheckContext => {
  const design: DesignFact[] = [];
  const photos = new Map<string, readonly PhotoFact[]>();
  const ofKind = new Map((FULL_CONTEXT.design ?? []).map((fact) => [fact.kind, fact]));
  const picturesOf = new Map([...(FULL_CONTEXT.photos ?? [])].map(([key, all]) => [key.split('|')[0], all]));
  for (const index of upTo(lines)) {
    const kind = kindOf(index);
    const fact = ofKind.get(kind);
    if (fact) design.push({ ...fact, structureNumber: nameOf(index), ...placeOf(index) });
    const key = `${kind}|${nameOf(index)}|1`;
    photos.set(
      key,
      (picturesOf.get(kind) ?? []).map((one) => ({
        ...one,
        id: `${key} ${one.id}`,
        sha256: `${key} ${one.sha256}`,
        // Every picture differs from every other by its number.
        facts: one.facts ? { ...one.facts, ...placeOf(index), phash: hashOf(index, one.view) } : null,
      })),
    );
  }
  return { ...FULL_CONTEXT, design, photos };
};

/** 64 bits that scatter with the number, so that pictures are not alike: two rounds of a multiplicative hash (Knuth's constant). */
const hashOf = (index: number, view: string): string => {
  const scatter = (seed: number): string =>
    (Math.imul(Math.imul(seed, 2_654_435_761) ^ (seed >>> 7), 2_246_822_519) >>> 0)
      .toString(16)
      .padStart(8, '0');
  const seed = index * 31 + view.length;
  return scatter(seed + 1) + scatter(seed ^ 0x5bd1e995);
};
