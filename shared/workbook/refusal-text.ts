import type { RefusalCode, RefusalParams } from './workbook-refused.ts';

const DAMAGED = 'Open it in your spreadsheet program, save it again as .xlsx, and upload the new file.';
const PLAIN = 'Save it as .xlsx (Excel Workbook) and upload that file.';
const SMALLER = 'Hand the work in as two batches, or remove what does not belong to the template.';

const DOCUMENTS: Readonly<Record<string, string>> = {
  word: 'a text document',
  slides: 'a slide show',
  drawing: 'a drawing',
};

type Params = RefusalParams;

/** Where in the workbook it is, as far as it is known: the cell, else the sheet, else the part within the file. */
function at({ sheet, address, part }: Params): string {
  if (sheet !== undefined) {
    return address === undefined
      ? ` in sheet “${String(sheet)}”`
      : ` at ${String(address)} of sheet “${String(sheet)}”`;
  }
  return part === undefined ? '' : ` (part “${String(part)}” of the file)`;
}

const count = (limit: Params[string] | undefined): string => Number(limit).toLocaleString('en-US');

const SENTENCES: Readonly<Record<RefusalCode, (params: Params) => string>> = {
  'empty-file': () =>
    'The file is empty. Choose the workbook again, and wait until it has been copied whole.',
  'file-too-large': ({ limitMb }) =>
    `The file is larger than ${String(limitMb)} MB. Remove pictures from the workbook; photographs are uploaded apart.`,
  'not-a-workbook': () => `The file is not an Excel workbook, whatever its name says. ${PLAIN}`,
  'old-workbook': () => `The workbook is in the old .xls format. ${PLAIN}`,
  'password-protected': () =>
    'The workbook is protected by a password and cannot be opened. Remove the password (File, Info, Protect Workbook) and upload it again.',
  'macro-enabled': () => `The workbook can run macros, which is not accepted. ${PLAIN}`,
  'binary-workbook': () => `The workbook is in the binary .xlsb format. ${PLAIN}`,
  'other-document': ({ what }) =>
    `The file is ${DOCUMENTS[String(what)] ?? 'another kind of document'}, not an Excel workbook. Upload the filled-in template.`,
  'zip-damaged': (params) =>
    `The file is damaged: ${params['part'] === undefined ? 'it is incomplete' : 'a part of it cannot be unpacked'}${at(params)}. ${DAMAGED}`,
  'zip-encrypted': (params) =>
    `A part of the file is encrypted${at(params)}. Save it as .xlsx without a password, and upload the new file.`,
  'zip-duplicate': (params) => `The file is damaged: it holds the same part twice${at(params)}. ${DAMAGED}`,
  'zip-too-many-entries': ({ limit }) =>
    `The file is made of more than ${count(limit)} parts. Remove pictures and what does not belong to the template, save it, and upload it again.`,
  'zip-too-large': (params) => `Unpacked, the file is far larger than any batch${at(params)}. ${SMALLER}`,
  'part-missing': (params) => `The file is damaged: a part that it names is missing${at(params)}. ${DAMAGED}`,
  'too-many-parts': (params) =>
    `A list in the file is far longer than that of any batch${at(params)}. ${DAMAGED}`,
  'xml-damaged': (params) => `The file is damaged: a part of it cannot be read${at(params)}. ${DAMAGED}`,
  'xml-doctype': (params) =>
    `The file holds instructions that no spreadsheet program writes${at(params)}. ${DAMAGED}`,
  'xml-too-deep': (params) =>
    `A part of the file is built in a way that no spreadsheet program writes${at(params)}. ${DAMAGED}`,
  'xml-too-long': (params) => `One text in the file is longer than any cell can be${at(params)}. ${DAMAGED}`,
  'string-index': (params) => `The file is damaged: the text of a cell is missing${at(params)}. ${DAMAGED}`,
  'cell-address': (params) =>
    `The file is damaged: a cell has an impossible address${at(params)}. ${DAMAGED}`,
  'cell-twice': (params) => `The file is damaged: a cell is there twice${at(params)}. ${DAMAGED}`,
  'too-many-sheets': ({ limit }) =>
    `The workbook has more than ${count(limit)} sheets. Remove the sheets that do not belong to the template, and upload it again.`,
  'too-many-rows': (params) =>
    `The workbook has more than ${count(params['limit'])} filled rows; the limit was passed${at(params)}. ${SMALLER}`,
  'too-many-cells': (params) =>
    `The workbook has more than ${count(params['limit'])} filled cells; the limit was passed${at(params)}. ${SMALLER}`,
  'too-many-merged': (params) =>
    `The workbook has more than ${count(params['limit'])} merged ranges; the limit was passed${at(params)}. Unmerge its cells, and upload it again.`,
  'too-much-text': (params) => `The workbook holds too much text${at(params)}. ${SMALLER}`,
  'reader-time': ({ seconds }) =>
    `Reading the workbook took longer than ${String(seconds)} seconds and was stopped. ${SMALLER}`,
  'reader-memory': () => `Reading the workbook needed too much memory and was stopped. ${SMALLER}`,
  'reader-failed': () =>
    `The workbook could not be read, and it is not known why. ${DAMAGED} If it happens again, tell the owner’s administrator.`,
};

/** Why a workbook was refused, as a sentence with its remedy. Nothing of a refused workbook was taken over. */
export function refusalText({
  code,
  params,
}: {
  readonly code: RefusalCode;
  readonly params: RefusalParams;
}): string {
  return SENTENCES[code](params);
}
