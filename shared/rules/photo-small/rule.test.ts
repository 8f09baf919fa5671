import { describeRule } from '../describe-rule.ts';
import { photoOf } from '../testing.ts';
import { photoSmall } from './rule.ts';

describeRule(photoSmall, {
  valid: [
    { name: 'upright, 1,000 px high', line: { photos: [photoOf('finish', { width: 750, height: 1000 })] } },
    { name: 'size not known', line: { photos: [photoOf('finish', {})] } },
    { name: 'not measured yet', line: { photos: [photoOf('finish', null)] } },
  ],
  invalid: [
    {
      name: 'a thumbnail',
      line: { photos: [photoOf('finish', { width: 640, height: 480 })] },
      expected: [
        { measured: 640, limit: 1000, margin: -360, unit: 'px', params: { fileName: 'finish.jpg' } },
      ],
    },
  ],
});
