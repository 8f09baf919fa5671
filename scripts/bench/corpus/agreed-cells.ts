import { readFile } from 'node:fs/promises';
import { gunzipSync } from 'node:zlib';

/** `n` number, `s` text, `b` boolean, `e` error, `d` date as the serial of the file's own date system. */
export type AgreedCell = readonly [kind: 'n' | 's' | 'b' | 'e' | 'd', value: string | number | boolean];

/** What a workbook holds, as other readers agree. */
export type AgreedWorkbook = {
  readonly date1904: boolean;
  readonly sheets: readonly {
    readonly name: string;
    /** Absent where the agreeing readers know none. */
    readonly state?: string;
    /** Absent on chart sheets. */
    readonly cells?: Readonly<Record<string, AgreedCell>>;
  }[];
};

/** The agreed contents beside a folder of workbooks (`FILE.json.gz`); null where nobody agreed on any. */
export async function readAgreed(folder: string, file: string): Promise<AgreedWorkbook | null> {
  try {
    const packed = await readFile(`${folder}/${file}.json.gz`);
    return JSON.parse(gunzipSync(packed).toString('utf8')) as AgreedWorkbook;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null;
    throw error;
  }
}
