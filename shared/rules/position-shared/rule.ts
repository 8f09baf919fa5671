import { byText } from '#shared/records/canonical.ts';
import { structureKey } from '#shared/records/structure-key.ts';
import { say } from '#shared/findings/say.ts';
import { belowLimit } from '../against-limit.ts';
import { statedPlace } from '../line-place.ts';
import { nearestStructure, type Point } from '../nearest-structure.ts';
import { numberOf, paramsSchema } from '../params.ts';
import type { BatchRule, LineView, NeighbourFact } from '../types.ts';

const schema = paramsSchema({
  leastFt: {
    type: 'number',
    title: 'Least distance from another structure',
    'x-unit': 'ft',
    default: 3,
    minimum: 0,
    maximum: 1000,
  },
});

type Structure = {
  readonly key: string;
  readonly name: string;
  readonly line: LineView | null;
  readonly own: boolean;
};

const ofLine = (line: LineView): Point<Structure>[] => {
  const stated = statedPlace(line);
  if (!stated || line.broken.has('structureNumber')) return [];
  const { structureNumber } = line;
  const of = { key: structureKey(structureNumber), name: structureNumber, line, own: true };
  return [{ ...stated, of }];
};

const ofNeighbour = (fact: NeighbourFact): Point<Structure> => ({
  place: fact,
  accuracyFt: fact.accuracyFt,
  of: { key: structureKey(fact.structureNumber), name: fact.structureNumber, line: null, own: fact.own },
});

/** An order that rows have no say in: which of two equally near ones is told must not hang on them. */
const byName = (a: Point<Structure>, b: Point<Structure>): number =>
  byText(a.of.key, b.of.key) || byText(a.of.name, b.of.name);

export const positionShared: BatchRule = {
  code: 'position-shared',
  title: 'Position shared',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'batch',
  severity: 'query',
  field: 'latitude',
  needs: ['neighbours'],
  paramsSchema: schema,
  check: ({ lines }, params, { neighbours }) => {
    if (neighbours === null) return [];
    const leastFt = numberOf(params, schema, 'leastFt');
    const mine = lines.flatMap(ofLine);
    const find = nearestStructure([...mine, ...neighbours.map(ofNeighbour)].toSorted(byName), leastFt);
    return mine.flatMap((point) => {
      const { key, line } = point.of;
      if (!line) return [];
      const replaced = structureKey(line.values['replacesStructure']);
      const near = find(point, (other) => other.key !== key && other.key !== replaced);
      if (!near) return [];
      const other = { other: near.other.name };
      const drafts = belowLimit({
        measured: near.apartFt,
        limit: leastFt,
        unit: 'ft',
        params: { distanceFt: near.distanceFt, ...(near.other.own ? other : {}) },
        ...(near.other.own ? {} : { ownerParams: other }),
      });
      return drafts.map((draft) => ({ ...draft, line }));
    });
  },
  message: ({ limit, params, ownerParams }) => {
    const name = params['other'] ?? ownerParams['other'];
    const other = name === undefined ? 'another structure' : `structure ${say(name, null)}`;
    return `The position is ${say(params['distanceFt'], 'ft')} from that of ${other}; less both accuracies at least ${say(limit, 'ft')} is expected.`;
  },
  remedy: () =>
    'Check both positions; a pole that takes the place of another names it as the structure it replaces.',
};
