import { describeRule } from '../describe-rule.ts';
import { photoOf } from '../testing.ts';
import { photoMissing } from './rule.ts';

const photos = (...views: string[]) => views.map((view) => photoOf(view));

describeRule(photoMissing, {
  valid: [
    {
      name: 'all of a set pole',
      line: { values: { waterIn: 1 }, photos: photos('bore-depth', 'water', 'kits', 'finish', 'plumb') },
    },
    {
      name: 'no water, no view of it',
      line: { values: { waterIn: 0 }, photos: photos('bore-depth', 'kits', 'finish', 'plumb') },
    },
    {
      name: 'all of a re-levelled pad',
      line: { kind: 'relevel', photos: photos('before', 'gap', 'kits', 'level-after') },
    },
    { name: 'photographs not known here', line: {} },
  ],
  invalid: [
    {
      name: 'two missing of a straightened pole',
      line: { kind: 'straighten', photos: photos('before', 'kits') },
      expected: [
        { limit: 'gap', field: 'gapAtGradeIn', measured: null, margin: null, part: 'gap' },
        { limit: 'after', field: 'structureNumber' },
      ],
    },
    {
      name: 'water recorded and not shown',
      line: { values: { waterIn: 1 }, photos: photos('bore-depth', 'kits', 'finish', 'plumb') },
      expected: [{ limit: 'water', field: 'waterIn' }],
    },
  ],
});
