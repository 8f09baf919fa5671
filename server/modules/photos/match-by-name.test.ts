import { describe, expect, it } from 'vitest';
import { matchByName, nameIndex, type NamedLine } from './match-by-name.ts';

const line = (structureNumber: string, kind: NamedLine['kind'] = 'set', occurrence = 1): NamedLine => ({
  lineId: `${structureNumber}/${kind}/${occurrence}`,
  kind,
  structureNumber,
  occurrence,
});
const LINES = [
  line('L-104'),
  line('L-104-2'),
  line('1042'),
  line('P 7/B'),
  line('X-9', 'straighten'),
  line('X-9'),
];

describe('matchByName', () => {
  it.each([
    ['L-104_bore-depth.jpg', 'L-104/set/1', 'bore-depth'],
    ['l104 BoreDepth (2).JPG', 'L-104/set/1', 'bore-depth'],
    ['2026-04-14 L_104.2 kits.jpeg', 'L-104-2/set/1', 'kits'],
    ['L-104-2-FINISH.png', 'L-104-2/set/1', 'finish'],
    ['1042kits.webp', '1042/set/1', 'kits'],
    ['water 1042.jpg', '1042/set/1', 'water'],
    ['P7B plumb.jpg', 'P 7/B/set/1', 'plumb'],
    ['Ｌ－１０４ ｋｉｔｓ.jpg', 'L-104/set/1', 'kits'],
    ['X-9 gap.jpg', 'X-9/straighten/1', 'gap'],
    ['X-9 plumb.jpg', 'X-9/set/1', 'plumb'],
  ])('%s is placed at %s, %s', (name, lineId, view) => {
    expect(matchByName(name, nameIndex(LINES))).toEqual({ lineId, view });
  });

  it.each([
    ['no view', 'L-104.jpg'],
    ['no structure', 'kits.jpg'],
    ['part of a longer number', 'L-1043 kits.jpg'],
    ['a number inside another', '10421 kits.jpg'],
    ['two kinds that both ask for the view', 'X-9 kits.jpg'],
    ['nothing', ''],
  ])('is left to be placed by hand: %s', (_why, name) => {
    expect(matchByName(name, nameIndex(LINES))).toBeNull();
  });

  it('is left to be placed by hand when two structures fit alike', () => {
    expect(matchByName('A-10 B-20 kits.jpg', nameIndex([line('A-10'), line('B-20')]))).toBeNull();
  });

  it('places at the first line where a structure stands twice', () => {
    expect(matchByName('S1 kits.jpg', nameIndex([line('S1'), line('S1', 'set', 2)]))?.lineId).toBe(
      'S1/set/1',
    );
  });
});
