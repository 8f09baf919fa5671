import { HEADLINE, LABEL, SUBHEAD, TEXT } from '#server/workbook/template-style.ts';
import type { Writer } from '#server/workbook/workbook-writer.ts';
import { rowHeight } from './as-built-layout.ts';
import { neutral } from '#shared/export/csv.ts';

export type Cover = {
  readonly owner: string;
  readonly number: string;
  readonly revision: number;
  readonly title: string;
  readonly scope: string;
  readonly issuedBy: string;
  /** Instant, ISO 8601. */
  readonly issuedAt: string;
  readonly standards: readonly number[];
  readonly counts: ReadonlyMap<string, number>;
  readonly nonconforming: number;
  readonly digest: string;
};

const VALUE_WIDTH = 76;

/** Keys in column A (hidden), titles in B, values in C: a program reads the cover as it reads the other sheets. */
export function writeCover(writer: Writer, cover: Cover): void {
  const sheet = writer.addWorksheet('Cover', {
    views: [{ showGridLines: false }],
    pageSetup: { orientation: 'portrait', fitToPage: true, fitToWidth: 1, fitToHeight: 1 },
    headerFooter: { oddFooter: `&L${cover.number} revision ${cover.revision}&RPage &P of &N` },
  });
  sheet.columns = [{ width: 14, hidden: true }, { width: 34 }, { width: VALUE_WIDTH }];
  const add = (key: string, title: string, value: string | number | null, style: object = TEXT) => {
    const row = sheet.addRow([key, title, typeof value === 'string' ? neutral(value) : value]);
    row.getCell(2).style = value === null ? style : LABEL;
    row.getCell(3).style = { ...style, alignment: { horizontal: 'left', vertical: 'top', wrapText: true } };
    // A heading stands clear of what is above it.
    const height = value === null ? 30 : rowHeight([{ text: String(value), width: VALUE_WIDTH }]);
    if (height !== undefined) row.height = height;
    row.commit();
  };
  add('', `As-built ${cover.number}`, null, HEADLINE);
  add('owner', 'Owner', cover.owner);
  add('transmittal', 'Transmittal', cover.number);
  add('revision', 'Revision', cover.revision);
  add('title', 'Title', cover.title);
  add('scope', 'Scope', cover.scope);
  add('issuedAt', 'Issued at (UTC)', cover.issuedAt.slice(0, 16).replace('T', ' '));
  add('issuedBy', 'Issued by', cover.issuedBy);
  add('standards', 'Standard, versions', cover.standards.join(', '));
  add('', 'What is in it', null, SUBHEAD);
  for (const [name, n] of cover.counts) add(`count:${name}`, name, n);
  add('nonconforming', 'Accepted by concession', cover.nonconforming);
  add('', 'Proof', null, SUBHEAD);
  add('digest', 'Digest of the content (SHA-256)', cover.digest);
  add('', 'Cautions', null, SUBHEAD);
  add(
    'cautions',
    'Read before use',
    'Figures are computed from what crews measured, with the uncertainty stated. Local codes, the manufacturer’s instructions and a licensed engineer decide.',
  );
  sheet.commit();
}
