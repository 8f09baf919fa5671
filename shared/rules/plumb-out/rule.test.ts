import { describeRule } from '../describe-rule.ts';
import { eventOf } from '../testing.ts';
import { plumbOut } from './rule.ts';

describeRule(plumbOut, {
  valid: [
    { name: 'plumb', line: { values: { leanInPer10Ft: 0 } } },
    { name: 'at the limit', line: { values: { leanInPer10Ft: 1, leanAzimuthDeg: 270 } } },
    {
      name: 'as raked',
      line: {
        values: {
          leanInPer10Ft: 3,
          leanAzimuthDeg: 90,
          designRakeInPer10Ft: 3.5,
          designRakeAzimuthDeg: 90,
        },
      },
    },
    {
      name: 'put right by an event',
      line: {
        values: { leanInPer10Ft: 4, leanAzimuthDeg: 10 },
        events: [eventOf('set', 2, { leanInPer10Ft: 0.2 })],
      },
    },
    { name: 'lean unreadable', line: { broken: ['leanInPer10Ft'] } },
    { name: 'direction missing', line: { values: { leanInPer10Ft: 3 }, broken: ['leanAzimuthDeg'] } },
    {
      name: 'rake unreadable',
      line: { values: { leanInPer10Ft: 3, leanAzimuthDeg: 5 }, broken: ['designRakeInPer10Ft'] },
    },
  ],
  invalid: [
    {
      name: 'a quarter inch over',
      line: { values: { leanInPer10Ft: 1.25, leanAzimuthDeg: 15 } },
      expected: [{ field: 'leanInPer10Ft', measured: 1.25, limit: 1, margin: -0.25, unit: 'in-per-10ft' }],
    },
    {
      // Three and four at a right angle: five apart.
      name: 'leans across its rake',
      line: {
        values: { leanInPer10Ft: 3, leanAzimuthDeg: 0, designRakeInPer10Ft: 4, designRakeAzimuthDeg: 90 },
      },
      expected: [{ measured: 5, limit: 1, margin: -4, params: { lean: 3, rake: 4 } }],
    },
    {
      // Without a direction the worst case counts: 1 + 0.2.
      name: 'a small lean without direction counts against the rake',
      line: { values: { leanInPer10Ft: 0.2, designRakeInPer10Ft: 1, designRakeAzimuthDeg: 180 } },
      expected: [{ measured: 1.2, limit: 1, margin: -0.2 }],
    },
    {
      name: 'left so by an event',
      line: {
        values: { leanInPer10Ft: 0 },
        events: [eventOf('set', 2, { leanInPer10Ft: 2, leanAzimuthDeg: 45 })],
      },
      expected: [{ measured: 2, margin: -1, params: { event: 2 } }],
    },
    {
      name: 'not measured',
      line: { values: { leanInPer10Ft: 'not-measured' } },
      expected: [{ unproved: 'leanInPer10Ft' }],
    },
    {
      name: 'a lean of an event without its direction',
      line: { values: { leanInPer10Ft: 0 }, events: [eventOf('set', 2, { leanInPer10Ft: 2 })] },
      expected: [{ unproved: 'leanAzimuthDeg' }],
    },
  ],
});
