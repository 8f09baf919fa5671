import { describe, expect, it } from 'vitest';
import { safeFileName } from './safe-file-name.ts';

describe('safeFileName', () => {
  it.each([
    ['batch 17.xlsx', 'batch 17.xlsx'],
    ['../../etc/passwd', 'passwd'],
    ['C:\\work\\L-104 kits.jpg', 'L-104 kits.jpg'],
    ['名前 17.xlsx', '名前 17.xlsx'],
    ['a\u0000b\r\nc.xlsx', 'abc.xlsx'],
    ['evil\u202Egpj.exe', 'evilgpj.exe'],
    ['  two   spaces .jpg ', 'two spaces .jpg'],
    ['..', 'unnamed'],
    ['', 'unnamed'],
    ['folder/', 'unnamed'],
  ])('%j becomes %j', (name, kept) => {
    expect(safeFileName(name)).toBe(kept);
  });

  it('shortens a long name and keeps its ending', () => {
    const kept = safeFileName(`${'x'.repeat(300)}.jpeg`);
    expect(kept).toBe(`${'x'.repeat(115)}.jpeg`);
  });
});
