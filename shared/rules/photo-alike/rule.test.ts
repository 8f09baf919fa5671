import { describeRule } from '../describe-rule.ts';
import { otherPhotoOf, photoOf } from '../testing.ts';
import { photoAlike } from './rule.ts';

const HASH = 'f0f0f0f0f0f0f0f0';
/** 6 and 7 bits from it: 0x3f and 0x7f turned over in its last byte and a half. */
const SIX = 'f0f0f0f0f0f0f0cf';
const SEVEN = 'f0f0f0f0f0f0f08f';
const facts = { phash: HASH };
const photo = photoOf('finish', facts);
const alike = (phash: string | null, own = true, view = 'finish') => ({
  photos: new Map([['set|S-1|1', [photo]]]),
  otherPhotos: [otherPhotoOf({ ...photo, sha256: 'other', view }, { structureNumber: 'S-7', own, phash })],
});
const line = { photos: [photo] };

describeRule(photoAlike, {
  valid: [
    { name: 'seven bits apart', line, context: alike(SEVEN) },
    { name: 'the other has no hash', line, context: alike(null) },
    { name: 'labels of kits', line: { photos: [photoOf('kits', facts)] }, context: alike(HASH) },
    { name: 'like labels of kits', line, context: alike(HASH, true, 'kits') },
    {
      name: 'not measured yet',
      line: { photos: [photoOf('finish', null)] },
      context: alike(HASH),
    },
    {
      name: 'the same bytes: photo-reused says so',
      line,
      context: {
        photos: new Map([['set|S-2|1', [photo]]]),
        otherPhotos: [],
      },
    },
    {
      name: 'of its own structure',
      line,
      context: { photos: new Map([['set|S-1|1', [photoOf('plumb', facts)]]]), otherPhotos: [] },
    },
  ],
  invalid: [
    {
      name: 'six bits apart',
      line,
      context: alike(SIX),
      expected: [
        {
          measured: 'finish.jpg',
          limit: null,
          margin: null,
          params: { bits: 6, greatest: 6, view: 'finish', other: 'S-7' },
        },
      ],
    },
    {
      name: 'of another contractor, the owner alone is told which',
      line,
      context: alike(HASH, false),
      expected: [{ params: { bits: 0 }, ownerParams: { other: 'S-7' } }],
    },
    {
      name: 'on another line of the batch, the nearest',
      line,
      context: {
        photos: new Map([
          ['set|S-3|1', [{ ...photoOf('finish', { phash: SIX }), sha256: 'three' }]],
          ['set|S-4|1', [{ ...photoOf('finish', { phash: HASH }), sha256: 'four' }]],
        ]),
        otherPhotos: [],
      },
      expected: [{ params: { bits: 0, other: 'S-4' } }],
    },
  ],
});
