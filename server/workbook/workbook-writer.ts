import { once } from 'node:events';
import { createWriteStream } from 'node:fs';
import type { Writable } from 'node:stream';
import ExcelJS from 'exceljs';

export type Writer = ExcelJS.stream.xlsx.WorkbookWriter;
export type SheetWriter = ExcelJS.Worksheet;

/** The streaming writer pipes each sheet into the archive and does not wait for it; its types do not show the pipe. */
type Piped = { readonly stream?: { readonly pipes?: readonly Writable[] } };

/** Waits until the archive has taken what was written of a sheet: rows that come quicker than they are packed would pile up in memory. */
export async function drained(sheet: SheetWriter): Promise<void> {
  for (const pipe of (sheet as unknown as Piped).stream?.pipes ?? [])
    if (pipe.writableNeedDrain) await once(pipe, 'drain');
}

export type Validation = {
  readonly type: 'list' | 'whole';
  readonly formulae: readonly (string | number)[];
  readonly errorStyle: 'stop' | 'warning';
  readonly error: string;
};

/** The streaming writer takes validations of whole ranges; its types do not say so. */
export function addValidation(sheet: SheetWriter, range: string, validation: Validation): void {
  const { dataValidations } = sheet as unknown as {
    dataValidations: { add: (range: string, validation: object) => void };
  };
  dataValidations.add(range, {
    ...validation,
    allowBlank: true,
    showErrorMessage: true,
    errorTitle: 'Please check',
  });
}

/**
 * Writes a workbook row by row to a file or a stream, without holding it in memory. `fill` adds and commits the sheets.
 * Rejects when the target fails; the target is ended.
 */
export async function streamWorkbook(
  target: string | Writable,
  options: {
    readonly keywords: string;
    readonly title: string;
    /** Texts kept once for the whole file: smaller, but held in memory. Off for what may be very long. */
    readonly sharedStrings?: boolean;
    /** When it counts as written; now, unless given. */
    readonly at?: Date;
  },
  fill: (writer: Writer) => void | Promise<void>,
): Promise<void> {
  const stream = typeof target === 'string' ? createWriteStream(target) : target;
  const broken = new Promise<never>((_, reject) => {
    stream.once('error', reject);
    stream.once('close', () => {
      // A target that took all of it may close before the writer hears so.
      if (!stream.writableFinished)
        reject(new Error('The target of the workbook was closed before it was written.'));
    });
  });
  // Heard below; not, should filling fail at once.
  broken.catch(() => undefined);
  const writer = new ExcelJS.stream.xlsx.WorkbookWriter({
    stream,
    useStyles: true,
    useSharedStrings: options.sharedStrings ?? true,
  });
  writer.creator = 'Upstand';
  writer.lastModifiedBy = 'Upstand';
  writer.title = options.title;
  writer.keywords = options.keywords;
  if (options.at) writer.created = writer.modified = options.at;
  const write = async (): Promise<void> => {
    await fill(writer);
    await writer.commit();
  };
  await Promise.race([write(), broken]);
}
