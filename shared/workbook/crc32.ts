const TABLE = Uint32Array.from({ length: 256 }, (_, index) => {
  let value = index;
  for (let bit = 0; bit < 8; bit++) value = value & 1 ? 0xedb88320 ^ (value >>> 1) : value >>> 1;
  return value;
});

/** CRC-32 as zip files carry it (ISO-HDLC), continued from `before`. Our own, since not every supported Node has one and browsers have none. */
export function crc32(bytes: Uint8Array, before = 0): number {
  let value = ~before;
  for (let index = 0; index < bytes.length; index++) {
    value = TABLE[(value ^ bytes[index]!) & 0xff]! ^ (value >>> 8);
  }
  return ~value >>> 0;
}
