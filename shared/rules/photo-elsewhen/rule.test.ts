import { describeRule } from '../describe-rule.ts';
import { eventOf, photoOf, pourOf } from '../testing.ts';
import { photoElsewhen } from './rule.ts';

const values = { boredAt: '2026-04-14T09:00', setAt: '2026-04-14T09:40', hardwareAt: '2026-04-14T10:40' };
const taken = (takenWall: string | null, view = 'finish') => [photoOf(view, { takenWall })];
const line = (photos: ReturnType<typeof taken>) => ({ values, photos });

describeRule(photoElsewhen, {
  valid: [
    { name: 'during the work', line: line(taken('2026-04-14T09:50:12')) },
    { name: 'half an hour before boring', line: line(taken('2026-04-14T08:30:00')) },
    { name: 'half an hour after the last time', line: line(taken('2026-04-14T11:10:00')) },
    { name: 'no capture time', line: line(taken(null)) },
    { name: 'not measured yet', line: line([photoOf('finish', null)]) },
    { name: 'a time that was not real', line: line(taken('2026-03-08T02:30:00')) },
    { name: 'no time of the work known', line: { photos: taken('2020-01-01T00:00:00') } },
    {
      // 14:50 UTC is 09:50 in Chicago.
      name: 'by its own offset',
      line: line([
        photoOf('finish', { takenWall: '2026-04-14T23:50:00', takenAtMs: Date.UTC(2026, 3, 14, 14, 50) }),
      ]),
    },
    {
      name: 'of a later event',
      line: {
        ...line(taken('2026-04-20T09:10:00', 'rework')),
        pours: [pourOf({ event: 2, pouredAt: '2026-04-20T09:00' })],
      },
    },
  ],
  invalid: [
    {
      name: 'an hour after the last time',
      line: line(taken('2026-04-14T11:40:00')),
      expected: [{ measured: '2026-04-14T11:40', limit: '2026-04-14T10:40', margin: -30, unit: 'min' }],
    },
    {
      name: 'the day before',
      line: line(taken('2026-04-13T09:00:00')),
      expected: [{ limit: '2026-04-14T09:00', margin: -1410, params: { offMin: 1440 } }],
    },
    {
      name: 'against a pour, the only time known',
      line: { photos: taken('2026-04-15T12:00:00'), pours: [pourOf()] },
      expected: [{ limit: '2026-04-14T10:00', margin: -1530 }],
    },
    {
      name: 'of rework, taken when it was first built',
      line: {
        ...line(taken('2026-04-14T09:50:00', 'rework')),
        events: [eventOf('set', 2, { beganAt: '2026-04-14T13:50' })],
      },
      expected: [{ limit: '2026-04-14T13:50', margin: -210 }],
    },
  ],
});
