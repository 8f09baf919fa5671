import { describe, expect, it } from 'vitest';
import { pictureType } from './picture-type.ts';

const bytes = (...parts: (string | number[])[]): Uint8Array =>
  Uint8Array.from(
    parts.flatMap((part) =>
      typeof part === 'string' ? Array.from(part, (letter) => letter.charCodeAt(0)) : part,
    ),
  );

describe('pictureType', () => {
  it.each([
    ['image/jpeg', bytes([0xff, 0xd8, 0xff, 0xe0])],
    ['image/png', bytes([0x89], 'PNG', [0x0d, 0x0a, 0x1a, 0x0a])],
    ['image/webp', bytes('RIFF', [1, 2, 3, 4], 'WEBPVP8 ')],
  ])('%s is known by its first bytes', (type, head) => {
    expect(pictureType(head)).toEqual({ type });
  });

  it.each([
    ['photo.empty', bytes()],
    ['photo.heic', bytes([0, 0, 0, 0x18], 'ftypheic')],
    ['photo.heic', bytes([0, 0, 0, 0x18], 'ftypmif1')],
    ['photo.not-a-picture', bytes([0, 0, 0, 0x18], 'ftypmp42')],
    ['photo.svg', bytes('<?xml version="1.0"?>\n<svg xmlns="http://www.w3.org/2000/svg"/>')],
    ['photo.type', bytes('GIF89a')],
    ['photo.not-a-picture', bytes('hello, this is a text file')],
    ['photo.not-a-picture', bytes('PK', [3, 4])],
    ['photo.not-a-picture', bytes([0xff, 0xd8])],
  ])('%s is refused with what to do', (code, head) => {
    expect(pictureType(head)).toMatchObject({ code, detail: expect.stringMatching(/JPEG|camera/u) });
  });
});
