import type { Scalar, WorkbookNotice } from '#shared/records/types.ts';

/** What is said about a workbook as a whole, by code: severity here, wording in notice-text.ts. */
export const NOTICE_SEVERITY = {
  'workbook-no-lines': 'nonconformity',
  'workbook-sheet-missing': 'nonconformity',
  'workbook-sheet-unknown': 'note',
  'workbook-sheet-renamed': 'nonconformity',
  'workbook-sheet-not-read': 'note',
  'workbook-header-missing': 'nonconformity',
  'workbook-column-missing': 'note',
  'workbook-column-unknown': 'note',
  'workbook-column-twice': 'nonconformity',
  'workbook-row-skipped': 'note',
  'workbook-merged': 'note',
  'workbook-template-old': 'note',
  'workbook-template-unknown': 'query',
  'workbook-keywords-differ': 'query',
  'workbook-other-order': 'nonconformity',
  'workbook-not-returned': 'note',
} as const satisfies Record<string, WorkbookNotice['severity']>;
export type NoticeCode = keyof typeof NOTICE_SEVERITY;

type Place = { readonly sheet?: string | null; readonly address?: string | null };

export function notice(
  code: NoticeCode,
  { sheet = null, address = null }: Place = {},
  params: Readonly<Record<string, Scalar>> = {},
): WorkbookNotice {
  return { code, severity: NOTICE_SEVERITY[code], sheet, address, params };
}
