import type { ReadingSource, SourcedGroup } from './fill-uncertainty.ts';
import { BUTT_FIELDS, GROUND_LINE_FIELDS, type PoleSize } from './pole-sizes.ts';
import { setSpace, setVoid, type SetSpace } from './set-space.ts';
import { numberOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';
import type { Standard } from '#shared/standard/types.ts';

const BORE_FIELDS = ['boreTopIn', 'boreTopAcrossIn', 'boreBottomIn', 'boreBottomAcrossIn', 'bellIn'] as const;
const DEPTH_FIELDS = ['boreDepthFt', 'embedmentFt'] as const;

const withPole = (space: SetSpace, groundLine: number, butt: number): SetSpace => ({
  ...space,
  pole: {
    ...space.pole,
    groundLineIn: space.pole.groundLineIn + groundLine,
    buttIn: space.pole.buttIn + butt,
  },
});

/** The field to tape (again) for a size; what the class table gave is best taped as a girth. */
function fieldOf(size: PoleSize, [girth, diameter]: readonly [string, string]): string | null {
  if (size.source === 'taper') return null;
  return size.source === 'diameter' ? diameter : girth;
}

/** The readings of a *set* void by tape: bore diameters, pole sizes, depths. */
export function setReadings(values: FieldValues, space: SetSpace, standard: Standard): SourcedGroup[] {
  const { uncertainty } = standard;
  const options = { foamFollowsGrade: standard.foamFollowsGrade };
  // One copy for all shifts of a line, put back after each: copying it for each took longer than the computation.
  const copy: Record<string, FieldValues[string]> = { ...values };
  /** The void with those of the fields that carry a number moved by so much. */
  const movedVoid = (fields: readonly string[], by: number) => {
    for (const field of fields) {
      const value = numberOf(values, field);
      if (value !== null) copy[field] = value + by;
    }
    const space = setSpace(copy, options);
    for (const field of fields) if (Object.hasOwn(values, field)) copy[field] = values[field] ?? null;
    return space === null ? null : setVoid(space);
  };
  const group = (
    source: ReadingSource,
    { u, fields, unit }: { u: number; fields: readonly string[]; unit: number },
  ): SourcedGroup => ({
    source,
    u,
    shifted: (by) => movedVoid(fields, by * unit),
    readings: fields.map((field) => ({
      field,
      shifted: (by) => movedVoid([field], by * unit),
    })),
  });

  const groundLine = fieldOf(space.sizes.groundLine, GROUND_LINE_FIELDS);
  const butt = fieldOf(space.sizes.butt, BUTT_FIELDS);
  // A size carried over by the taper moves with the one that was taped.
  const ends = [
    { field: groundLine, groundLine: 1, butt: butt === null ? 1 : 0 },
    { field: butt, groundLine: groundLine === null ? 1 : 0, butt: 1 },
  ];
  const pole: SourcedGroup = {
    source: 'pole',
    u: space.sizes.taped ? uncertainty.poleTapedIn : uncertainty.poleTableIn,
    shifted: (by) => setVoid(withPole(space, by, by)),
    readings: ends.flatMap(({ field, groundLine, butt }) =>
      field === null
        ? []
        : [{ field, shifted: (by: number) => setVoid(withPole(space, by * groundLine, by * butt)) }],
    ),
  };
  return [
    group('bore', { u: uncertainty.boreIn, fields: BORE_FIELDS, unit: 1 }),
    pole,
    group('depth', { u: uncertainty.depthIn, fields: DEPTH_FIELDS, unit: 1 / 12 }),
  ];
}
