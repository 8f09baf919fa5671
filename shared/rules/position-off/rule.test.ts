import { describeRule } from '../describe-rule.ts';
import { positionOff } from './rule.ts';

const design = {
  structureNumber: 'S-1',
  kind: 'set' as const,
  poleLengthFt: null,
  poleClass: null,
  poleMaterial: null,
  embedmentFt: null,
  latitude: 40,
  longitude: -105,
};
const context = { design: [design] };
/** 0.0005° of longitude at 40° north are 42.69692847946 m (GeographicLib), 140.08178635 ft. */
const EAST = { latitude: 40, longitude: -104.9995 };

describeRule(positionOff, {
  valid: [
    { name: 'where it was planned', line: { values: { latitude: 40, longitude: -105 } }, context },
    {
      name: 'at the limit: none off and none allowed',
      line: { values: { latitude: 40, longitude: -105 } },
      context,
      params: { limitFt: 0 },
    },
    { name: 'so far as its accuracy explains', line: { values: { ...EAST, accuracyFt: 126 } }, context },
    {
      name: 'the design has no position',
      line: { values: EAST },
      context: { design: [{ ...design, latitude: null }] },
    },
    { name: 'not on the order', line: { structureNumber: 'S-2', values: EAST }, context },
    { name: 'latitude unreadable', line: { values: { longitude: -104 }, broken: ['latitude'] }, context },
    { name: 'accuracy unreadable', line: { values: EAST, broken: ['accuracyFt'] }, context },
    { name: 'the other side of the globe', line: { values: { latitude: -40, longitude: 75 } }, context },
  ],
  invalid: [
    {
      name: '140 ft to the east',
      line: { values: EAST },
      context,
      digits: 6,
      expected: [{ measured: 140.08178634992632, limit: 15, margin: -125.08178634992632, unit: 'ft' }],
    },
    {
      name: 'less its accuracy',
      line: { values: { ...EAST, accuracyFt: 100 } },
      context,
      digits: 6,
      expected: [{ measured: 40.08178634992632, margin: -25.08178634992632, params: { accuracyFt: 100 } }],
    },
  ],
});
