import { describeRule } from '../describe-rule.ts';
import { otherPhotoOf, photoOf } from '../testing.ts';
import { photoReused } from './rule.ts';

const finish = photoOf('finish');
const line = { photos: [finish] };
const elsewhere = (structureNumber: string, own: boolean) => ({
  photos: new Map([['set|S-1|1', [finish]]]),
  otherPhotos: [otherPhotoOf(finish, { structureNumber, own })],
});

describeRule(photoReused, {
  valid: [
    { name: 'its own', line, context: { photos: new Map([['set|S-1|1', [finish]]]), otherPhotos: [] } },
    { name: 'of the same structure in another batch', line, context: elsewhere(' s-1', true) },
    {
      name: 'of the same structure on another sheet',
      line,
      context: { photos: new Map([['straighten|S-1|1', [finish]]]), otherPhotos: [] },
    },
    { name: 'no photographs', line: { photos: null } },
  ],
  invalid: [
    {
      name: 'on another line of the batch',
      line,
      context: {
        photos: new Map([
          ['set|S-1|1', [finish]],
          ['set|S-2|1', [photoOf('finish')]],
        ]),
        otherPhotos: [],
      },
      expected: [
        {
          measured: 'finish.jpg',
          limit: null,
          margin: null,
          params: { view: 'finish', other: 'S-2' },
          ownerParams: {},
        },
      ],
    },
    {
      name: 'of the contractor in another batch',
      line,
      context: elsewhere('S-7', true),
      expected: [{ params: { view: 'finish', other: 'S-7', otherBatch: 'B-9' } }],
    },
    {
      name: 'of another contractor: whose it is is for the owner alone',
      line,
      context: elsewhere('S-7', false),
      expected: [{ params: { view: 'finish' }, ownerParams: { other: 'S-7', otherBatch: 'B-9' } }],
    },
  ],
});
