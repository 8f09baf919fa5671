import { describeRule } from '../describe-rule.ts';
import { photoOf } from '../testing.ts';
import { photoUndated } from './rule.ts';

describeRule(photoUndated, {
  valid: [
    { name: 'dated', line: { photos: [photoOf('finish', { takenWall: '2026-04-14T10:00:00' })] } },
    { name: 'an instant alone', line: { photos: [photoOf('finish', { takenAtMs: 0 })] } },
    { name: 'not measured yet', line: { photos: [photoOf('finish', null)] } },
    { name: 'photographs not known', line: { photos: null } },
  ],
  invalid: [
    {
      name: 'undated',
      line: { photos: [photoOf('finish', {})] },
      expected: [{ measured: 'finish.jpg', limit: null, margin: null, params: { view: 'finish' } }],
    },
  ],
});
