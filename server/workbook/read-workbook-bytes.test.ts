import { describe, expect, it } from 'vitest';
import { workbookParts } from '#shared/workbook/xml/parts-for-tests.ts';
import { readWorkbookBytes } from './read-workbook-bytes.ts';
import { zipOf, zipParts } from './zip-for-tests.ts';

const SHEET = 'xl/worksheets/sheet1.xml';
const parts = (data = '<row><c><v>1</v></c></row>') => workbookParts(data);
const refused = (bytes: Buffer) =>
  readWorkbookBytes(bytes).then(
    () => 'read',
    (error: { code?: string }) => error.code,
  );
const OLE = Buffer.from('d0cf11e0a1b11ae1', 'hex');

describe('what a file is, by its content', () => {
  it.each([
    ['nothing', Buffer.alloc(0), 'empty-file'],
    ['text', Buffer.from('structure;depth\n1;6'), 'not-a-workbook'],
    ['a picture', Buffer.from('ffd8ffe000104a464946', 'hex'), 'not-a-workbook'],
    ['an old workbook', Buffer.concat([OLE, Buffer.alloc(600)]), 'old-workbook'],
    [
      'a protected one',
      Buffer.concat([OLE, Buffer.alloc(600), Buffer.from('EncryptedPackage', 'utf16le')]),
      'password-protected',
    ],
    ['a zip of something else', zipOf([{ name: 'readme.txt', content: 'x' }]), 'not-a-workbook'],
    [
      'an open document',
      zipOf([{ name: 'mimetype', content: 'application/vnd.oasis.opendocument.spreadsheet' }]),
      'other-document',
    ],
    ['a workbook with macros', zipParts({ ...parts(), 'xl/vbaProject.bin': 'x' }), 'macro-enabled'],
  ])('%s', async (_, bytes, code) => {
    expect(await refused(bytes)).toBe(code);
  });

  it('refuses every beginning of a workbook', async () => {
    const whole = zipParts(parts());
    for (let length = 0; length < whole.length; length += 97) {
      expect(await refused(whole.subarray(0, length))).not.toBe('read');
    }
    expect(await refused(whole)).toBe('read');
  });
});

describe('the zip file', { timeout: 30_000 }, () => {
  it('may use backslashes and any case in its names', async () => {
    const { [SHEET]: sheet, ...rest } = parts();
    expect(await refused(zipParts({ ...rest, 'xl\\Worksheets\\Sheet1.xml': sheet! }))).toBe('read');
  });

  it('is refused where two names are one', async () => {
    expect(await refused(zipParts({ ...parts(), 'XL\\worksheets/SHEET1.xml': '<worksheet/>' }))).toBe(
      'zip-duplicate',
    );
  });

  it('is refused with a wrong checksum, a wrong size or an encrypted entry', async () => {
    expect(await refused(zipParts(parts(), { [SHEET]: { crc: 1 } }))).toBe('zip-damaged');
    expect(await refused(zipParts(parts(), { [SHEET]: { size: 10 } }))).toBe('zip-damaged');
    expect(await refused(zipParts(parts(), { [SHEET]: { size: 100_000 } }))).toBe('zip-damaged');
    expect(await refused(zipParts(parts(), { [SHEET]: { flags: 0x801 } }))).toBe('zip-encrypted');
  });

  it('is refused where it expands hugely, whether or not it says so', async () => {
    const bomb = { ...parts(), [SHEET]: `<worksheet><!--${' '.repeat(7_000_000)}--></worksheet>` };
    expect(await refused(zipParts(bomb))).toBe('zip-too-large');
    expect(await refused(zipParts(bomb, { [SHEET]: { size: 4_000_000 } }))).toMatch(
      /^(zip-too-large|zip-damaged|xml-too-long)$/,
    );
    expect(await refused(zipParts(parts(), { [SHEET]: { size: 300_000_000 } }))).toBe('zip-too-large');
  });

  it('is refused with too many entries', async () => {
    const many = Array.from({ length: 2_001 }, (_, index) => ({ name: `a${index}`, content: '' }));
    expect(await refused(zipOf(many))).toBe('zip-too-many-entries');
  });

  it('gives no more than the cells that a workbook may have', async () => {
    const texts = Array.from(
      { length: 3 },
      () => `<row>${`<c t="str"><v>${'ab'.repeat(20_000)}</v></c>`.repeat(450)}</row>`,
    );
    expect(await refused(zipParts(parts(texts.join(''))))).toMatch(/^(too-much-text|zip-too-large)$/);
    const long = `<row><c t="str"><v>${'ab'.repeat(60_000)}</v></c></row>`;
    expect(await refused(zipParts(parts(long)))).toBe('too-much-text');
  });
});
