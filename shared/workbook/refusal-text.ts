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

/** Where in the workbook it is, as far as it is known. */
function at({ sheet, address }: Params): string {
  if (sheet === undefined) return '';
  return address === undefined
    ? ` in sheet “${String(sheet)}”`
    : ` at ${String(address)} of sheet “${String(sheet)}”`;
}

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
  'zip-damaged': () => `The file is damaged: a part of it cannot be unpacked. ${DAMAGED}`,
  'zip-encrypted': () => `A part of the file is encrypted. ${DAMAGED}`,
  'zip-duplicate': () => `The file is damaged: it holds the same part twice. ${DAMAGED}`,
  'zip-too-many-entries': () => `The file is made of too many parts. ${DAMAGED}`,
  'zip-too-large': () => `Unpacked, the file is far larger than any batch. ${SMALLER}`,
  'part-missing': (params) => `The file is damaged: a part that it names is missing${at(params)}. ${DAMAGED}`,
  'xml-damaged': () => `The file is damaged: a part of it cannot be read. ${DAMAGED}`,
  'xml-doctype': () => `The file holds instructions that no spreadsheet program writes. ${DAMAGED}`,
  'xml-too-deep': () => `A part of the file is built in a way that no spreadsheet program writes. ${DAMAGED}`,
  'xml-too-long': () => `One text in the file is longer than any cell can be. ${DAMAGED}`,
  'string-index': (params) => `The file is damaged: the text of a cell is missing${at(params)}. ${DAMAGED}`,
  'cell-address': (params) =>
    `The file is damaged: a cell has an impossible address${at(params)}. ${DAMAGED}`,
  'cell-twice': (params) => `The file is damaged: a cell is there twice${at(params)}. ${DAMAGED}`,
  'too-many-sheets': () => `The workbook has too many sheets. ${SMALLER}`,
  'too-many-rows': ({ limit }) => `The workbook has more than ${String(limit)} filled rows. ${SMALLER}`,
  'too-many-cells': () => `The workbook has too many filled cells. ${SMALLER}`,
  'too-much-text': () => `The workbook holds too much text. ${SMALLER}`,
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
