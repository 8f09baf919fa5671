import { pipeline } from 'node:stream/promises';
import type { Response } from 'express';
import type { EntityManager } from '@mikro-orm/postgresql';
import { safeFileName } from '#server/uploads/safe-file-name.ts';
import { createPdf } from './create-pdf.ts';
import { layOutSheet } from './lay-out-sheet.ts';
import type { Paper } from './paper.ts';
import { readLimits, readSheetContent, type Viewer } from './read-sheet-content.ts';
import { markWriter } from './write-marks.ts';
import { writePages } from './write-pages.ts';

/** Streams the PDF of one record sheet. @throws Problem 404 for another contractor's record as for none */
export async function sendSheet(
  em: EntityManager,
  options: { readonly id: string; readonly paper: Paper; readonly res: Response } & Viewer,
): Promise<void> {
  const { paper, res } = options;
  const content = await readSheetContent(em, { ...options, limitsOf: readLimits() });
  const pages = layOutSheet(content, paper);
  const { structure, owner } = content.data.titleBlock;
  const doc = createPdf({ paper, title: `Record sheet ${structure}`, author: owner, madeAt: new Date() });
  res
    .type('application/pdf')
    .attachment(safeFileName(`${structure}-sheet.pdf`))
    .set('Cache-Control', 'private, no-store');
  const sent = pipeline(doc, res);
  writePages(doc, { pages, first: 1, total: pages.length, write: markWriter(doc) });
  doc.end();
  await sent;
}
