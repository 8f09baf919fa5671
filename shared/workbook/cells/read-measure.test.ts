import { describe, expect, it } from 'vitest';
import {
  field,
  FEET,
  INCHES,
  LEAN,
  KIT,
  COUNT,
  TEMPERATURE,
  textCell,
  SYSTEM,
  read,
} from './cells-for-tests.ts';
import { readCell } from './read-cell.ts';

describe('lengths in feet', () => {
  // Literals by hand: 1 in is 1/12 ft.
  it.each([
    ['6.5', 6.5],
    [' 6.5\u00a0', 6.5],
    ['６．５', 6.5],
    ['1,200.5', 1200.5],
    ['6 1/2', 6.5],
    ['6½', 6.5],
    ["6'", 6],
    ['6 ft', 6],
    ['6.5 feet', 6.5],
    [`6'-6"`, 6.5],
    [`6' 6"`, 6.5],
    ['6’ 6”', 6.5],
    ['6′6″', 6.5],
    [`6' 6`, 6.5],
    ['6 ft 6 in', 6.5],
    ['6 ft. 6 in.', 6.5],
    ['6 ft 7 1/2 in', 6.625],
    [`5' 10 1/2''`, 5.875],
    [`-1' 6"`, -1.5],
    ['\u22126.5', -6.5],
    ['+6.5', 6.5],
    ['.5', 0.5],
    ['0', 0],
    ['-0', 0],
  ])('%s is %d', (raw, feet) => {
    expect(read(raw, FEET)).toBe(feet);
  });

  it.each([
    ['1.200,5', 'separators'],
    ['6,5', 'separators'],
    ['1,20', 'separators'],
    ['6..5', 'separators'],
    ['78 in', 'record-unit'],
    ['18"', 'record-unit'],
    ['2 m', 'record-unit'],
    ['6 yd', 'record-unit'],
    [`5' 14"`, 'inches'],
    [`5.5' 6"`, 'length'],
    ['6 3/2', 'fraction'],
    ['6 1/0', 'fraction'],
    ['about 6', 'length'],
    ['6 or 7', 'length'],
    ['6-7', 'length'],
    [`1'000.00`, 'length'],
    ['--6', 'length'],
    ['+-6', 'length'],
    ['6²', 'length'],
    ['1e3', 'length'],
    ['0x10', 'length'],
    ['Infinity', 'length'],
    ['=6.5', 'length'],
    ['n/a', 'length'],
    ['-', 'length'],
    ['6 6', 'length'],
    ['٦', 'length'],
  ])('%s is not read: %s', (raw, why) => {
    expect(read(raw, FEET)).toBe(why);
  });
});

describe('lengths in inches', () => {
  it.each([
    ['18', 18],
    ['18.5', 18.5],
    ['18 1/2', 18.5],
    ['18-1/2', 18.5],
    ['18"', 18],
    ['18 in', 18],
    ['18 inches', 18],
    ['1/2', 0.5],
    ['-1/2"', -0.5],
    ['18 1/2"', 18.5],
  ])('%s is %d', (raw, inches) => {
    expect(read(raw, INCHES)).toBe(inches);
  });

  it.each([
    ['18 ft', 'record-unit'],
    ["1'", 'record-unit'],
    [`1' 6"`, 'record-unit'],
    ['450 mm', 'record-unit'],
    ['45 cm', 'record-unit'],
    ['18 °F', 'record-unit'],
    ['18 bananas', 'length'],
  ])('%s is not read: %s', (raw, why) => {
    expect(read(raw, INCHES)).toBe(why);
  });

  it('takes the words of a lean, not those of another', () => {
    expect(read('0.4 in per 10 ft', LEAN)).toBe(0.4);
    expect(read('3/8"', LEAN)).toBe(0.375);
    expect(read('0.4 in per ft', LEAN)).toBe('record-unit');
    expect(read('1 deg', LEAN)).toBe('record-unit');
  });
});

describe('numbers, counts and temperatures', () => {
  it.each([
    ['4', KIT, 4],
    ['2.5 ft³', KIT, 2.5],
    ['2.5 cu ft', KIT, 2.5],
    ['2.5 L', KIT, 'record-unit'],
    ['2', COUNT, 2],
    ['2.0', COUNT, 2],
    ['2 kits', COUNT, 2],
    ['2.5', COUNT, 'whole'],
    ['two', COUNT, 'number'],
    ['72', TEMPERATURE, 72],
    ['72 °F', TEMPERATURE, 72],
    ['72F', TEMPERATURE, 72],
    ['72°', TEMPERATURE, 72],
    ['\u22124', TEMPERATURE, -4],
    ['22 C', TEMPERATURE, 'record-unit'],
    ['22 °C', TEMPERATURE, 'record-unit'],
    ['warm', TEMPERATURE, 'temperature'],
    ['1.5%', KIT, 'record-unit'],
  ] as const)('%s', (raw, as, expected) => {
    expect(read(raw, as)).toBe(expected);
  });

  it('names the unit found and the unit of the column', () => {
    expect(readCell(textCell('18 ft'), INCHES, SYSTEM)).toEqual({
      problem: { code: 'record-unit', params: { found: 'ft', expected: 'in' } },
    });
  });
});

describe('degrees', () => {
  const latitude = field('degrees', { key: 'latitude', unit: 'deg' });
  const longitude = field('degrees', { key: 'longitude', unit: 'deg' });
  const azimuth = field('degrees', { key: 'leanAzimuthDeg', unit: 'deg' });
  it.each([
    ['38.94512', latitude, 38.94512],
    ['38.94512° N', latitude, 38.94512],
    ['N 38.5', latitude, 38.5],
    ['33.5 S', latitude, -33.5],
    ['92.4137 W', longitude, -92.4137],
    ['-92.4137', longitude, -92.4137],
    [`41° 15' 36" N`, latitude, 41.26],
    [`92° 30' W`, longitude, -92.5],
    ['275 deg', azimuth, 275],
    ['275 degrees', azimuth, 275],
    ['-92.4 W', longitude, 'hemisphere'],
    ['92.4 N', longitude, 'hemisphere'],
    ['NE', azimuth, 'degrees'],
    ['--92.4', longitude, 'degrees'],
    ['+38.9', latitude, 38.9],
    ['-+38.9', latitude, 'degrees'],
    ['45 W', azimuth, 'hemisphere'],
    [`41° 75'`, latitude, 'degrees'],
    ['38,94512', latitude, 'separators'],
    ['north', azimuth, 'degrees'],
  ] as const)('%s', (raw, as, expected) => {
    expect(read(raw, as)).toBe(expected);
  });
});
