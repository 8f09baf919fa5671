import { describeRule } from '../describe-rule.ts';
import { photoOf } from '../testing.ts';
import { photoElsewhere } from './rule.ts';

const values = { latitude: 40, longitude: -105 };
/** 0.0005° of latitude at 40° north are 55.517319 m (high-precision inverse on WGS 84), 182.1434 ft. */
const north = [photoOf('finish', { latitude: 40.0005, longitude: -105 })];

describeRule(photoElsewhere, {
  valid: [
    {
      name: 'at the structure',
      line: { values, photos: [photoOf('finish', { latitude: 40, longitude: -105 })] },
    },
    {
      name: 'at the limit: none off and none allowed',
      line: { values, photos: [photoOf('finish', { latitude: 40, longitude: -105 })] },
      params: { limitFt: 0 },
    },
    { name: 'no position in it', line: { values, photos: [photoOf('finish', {})] } },
    { name: 'not measured yet', line: { values, photos: [photoOf('finish', null)] } },
    { name: 'where the structure stands is not known', line: { photos: north } },
  ],
  invalid: [
    {
      name: '182 ft off',
      line: { values, photos: north },
      digits: 4,
      expected: [
        { measured: 182.1434, limit: 150, margin: -32.1434, unit: 'ft', params: { view: 'finish' } },
      ],
    },
  ],
});
