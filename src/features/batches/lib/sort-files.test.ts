import { expect, it } from 'vitest';
import { sortFiles } from './sort-files.ts';

const file = (name: string, type = '') => new File(['x'], name, { type });

it('tells workbooks, photographs and the rest apart, and leaves out what systems hide', () => {
  const sorted = sortFiles([
    file('week 15.XLSX'),
    file('old.xls'),
    file('17-0426 bore-depth.JPG'),
    file('from-camera', 'image/jpeg'),
    file('notes.txt'),
    file('.DS_Store'),
    file('~$week 15.xlsx'),
    file('Thumbs.db'),
  ]);
  expect(sorted.workbooks.map((one) => one.name)).toEqual(['week 15.XLSX', 'old.xls']);
  expect(sorted.photographs.map((one) => one.name)).toEqual(['17-0426 bore-depth.JPG', 'from-camera']);
  expect(sorted.others).toEqual(['notes.txt']);
});
