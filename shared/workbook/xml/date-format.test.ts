import { expect, it } from 'vitest';
import { dateFormatOf } from './date-format.ts';

it.each([
  [0, undefined, 'none'],
  [14, undefined, 'day'],
  [22, undefined, 'time'],
  [46, undefined, 'time'],
  [49, undefined, 'none'],
  [164, 'General', 'none'],
  [164, '0.00" days"', 'none'],
  [164, '[Red]0.0', 'none'],
  [164, '#,##0\\d', 'none'],
  [164, '0.00E+00', 'none'],
  [164, '[$-409]m/d/yyyy h:mm AM/PM', 'time'],
  [164, '[h]:mm', 'time'],
  [164, 'dd.mm.yyyy', 'day'],
  [14, '0.00', 'none'],
] as const)('format %i %s shows %s', (id, code, shown) => {
  expect(dateFormatOf(id, code)).toBe(shown);
});
