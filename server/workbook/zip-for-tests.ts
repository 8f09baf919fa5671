import { deflateRawSync } from 'node:zlib';
import { crc32 } from '#shared/workbook/crc32.ts';

export type ZipEntry = {
  readonly name: string;
  readonly content: string | Buffer;
  /** Lies, each instead of the true value. */
  readonly flags?: number;
  readonly crc?: number;
  readonly size?: number;
  /** 8 deflated, the default; 0 stored; any other is a lie. */
  readonly method?: number;
  /** What stands in the file, packed already; `content` is not looked at. */
  readonly packed?: Buffer;
};

function header(entry: ZipEntry, packed: Buffer, bytes: Buffer): Buffer {
  const fields = Buffer.alloc(26);
  fields.writeUInt16LE(20, 0);
  fields.writeUInt16LE(entry.flags ?? 0x800, 2);
  fields.writeUInt16LE(entry.method ?? 8, 4);
  fields.writeUInt32LE(entry.crc ?? crc32(bytes), 10);
  fields.writeUInt32LE(packed.length, 14);
  fields.writeUInt32LE(entry.size ?? bytes.length, 18);
  fields.writeUInt16LE(Buffer.byteLength(entry.name), 22);
  return fields;
}

/** A zip file of the entries as given, lies and all. */
export function zipOf(entries: readonly ZipEntry[]): Buffer {
  const local: Buffer[] = [];
  const directory: Buffer[] = [];
  let offset = 0;
  for (const entry of entries) {
    const bytes = Buffer.from(entry.content);
    const packed = entry.packed ?? (entry.method === 0 ? bytes : deflateRawSync(bytes));
    const fields = header(entry, packed, bytes);
    const name = Buffer.from(entry.name);
    const record = Buffer.concat([Buffer.from('PK\u0003\u0004'), fields, name, packed]);
    const tail = Buffer.alloc(14);
    tail.writeUInt32LE(offset, 10);
    directory.push(Buffer.from('PK\u0001\u0002\u0014\u0000'), fields, tail, name);
    local.push(record);
    offset += record.length;
  }
  const index = Buffer.concat(directory);
  const end = Buffer.alloc(22);
  end.write('PK\u0005\u0006', 'latin1');
  end.writeUInt16LE(entries.length, 8);
  end.writeUInt16LE(entries.length, 10);
  end.writeUInt32LE(index.length, 12);
  end.writeUInt32LE(offset, 16);
  return Buffer.concat([...local, index, end]);
}

/** A zip file of parts by name, with changes to single entries. */
export function zipParts(
  parts: Readonly<Record<string, string | Uint8Array>>,
  lies: Readonly<Record<string, Partial<ZipEntry>>> = {},
): Buffer {
  return zipOf(
    Object.entries(parts).map(([name, content]) => ({
      name,
      content: typeof content === 'string' ? content : Buffer.from(content),
      ...lies[name],
    })),
  );
}
