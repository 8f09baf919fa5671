import { expect, it } from 'vitest';
import { crc32 } from './crc32.ts';

// Check value of CRC-32/ISO-HDLC: the catalogue of parametrised CRC algorithms.
it('gives the check value, in one go and in pieces', () => {
  const bytes = new TextEncoder().encode('123456789');
  expect(crc32(bytes)).toBe(0xcbf43926);
  expect(crc32(bytes.subarray(4), crc32(bytes.subarray(0, 4)))).toBe(0xcbf43926);
  expect(crc32(new Uint8Array())).toBe(0);
});
