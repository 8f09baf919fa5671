import { expect, it } from 'vitest';
import { relationshipsPart, resolveTarget } from './resolve-target.ts';

it.each([
  ['xl/workbook.xml', 'worksheets/sheet1.xml', 'xl/worksheets/sheet1.xml'],
  ['xl/workbook.xml', '/xl/Worksheets/Sheet1.xml', 'xl/worksheets/sheet1.xml'],
  ['xl/workbook.xml', '../custom/./a.xml', 'custom/a.xml'],
  ['xl/workbook.xml', 'worksheets\\sheet1.xml', 'xl/worksheets/sheet1.xml'],
  ['xl/workbook.xml', '../../../etc/passwd', 'etc/passwd'],
  ['', 'xl/workbook.xml', 'xl/workbook.xml'],
])('from %s to %s is %s', (from, target, part) => {
  expect(resolveTarget(from, target)).toBe(part);
});

it('names the part with a part’s relationships', () => {
  expect(relationshipsPart('xl/workbook.xml')).toBe('xl/_rels/workbook.xml.rels');
  expect(relationshipsPart('workbook.xml')).toBe('_rels/workbook.xml.rels');
});
