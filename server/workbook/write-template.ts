import type { Writable } from 'node:stream';
import type { AddWorksheetOptions } from 'exceljs';
import { formatKeywords } from '#shared/workbook/keywords.ts';
import { HEADER_ROWS, LAYOUT, type SheetLayout, TEMPLATE_VERSION } from '#shared/workbook/layout.ts';
import { pagesAcross } from './print-pages.ts';
import { writeGuide } from './template-guide.ts';
import { LISTS_SHEET, templateLists, writeLists } from './template-lists.ts';
import { prepareColumns, widthOf, writeTemplateSheet } from './template-sheet.ts';
import { HEADLINE, HINT, LABEL, PREFILLED, TEXT } from './template-style.ts';
import type { TemplateInput } from './template-types.ts';
import { type SheetWriter, streamWorkbook } from './workbook-writer.ts';

/** A footer's ampersand begins a code; two make one. */
const inFooter = (text: string): string => text.replaceAll('&', '&&');

function options(
  { workOrder }: TemplateInput,
  more: Partial<AddWorksheetOptions>,
): Partial<AddWorksheetOptions> {
  return {
    ...more,
    headerFooter: {
      oddFooter: `&L${inFooter(`Work order ${workOrder.number}`)}&C&A&RPage &P of &N`,
      ...more.headerFooter,
    },
    // No paper size: it prints on Letter and A4 alike.
    pageSetup: {
      orientation: 'landscape',
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      margins: { left: 0.4, right: 0.4, top: 0.5, bottom: 0.6, header: 0.3, footer: 0.3 },
      ...more.pageSetup,
    },
  };
}

function writeBatch(sheet: SheetWriter, layout: SheetLayout, { workOrder, contractor }: TemplateInput): void {
  const values = new Map([
    ['workOrder', workOrder.number],
    ['contractor', contractor],
    ['templateVersion', TEMPLATE_VERSION],
  ]);
  const title = sheet.addRow(['', 'This batch']);
  title.height = 30;
  Object.assign(title.getCell(2), HEADLINE);
  title.commit();
  for (const column of layout.columns) {
    const known = values.get(column.key);
    const row = sheet.addRow([
      column.key,
      `${column.title}${column.required ? ' *' : ''}`,
      known ?? null,
      column.description,
    ]);
    Object.assign(row.getCell(2), LABEL);
    Object.assign(row.getCell(3), known === undefined ? TEXT : PREFILLED, { numFmt: '@' });
    Object.assign(row.getCell(4), HINT);
    row.height = column.key === 'notes' ? 60 : 22;
    row.commit();
  }
}

/** Writes the workbook template of a work order to a stream and ends it: guide, sheets with prefilled design rows, drop-downs. Rejects when the stream fails. */
export async function writeTemplate(stream: Writable, input: TemplateInput): Promise<void> {
  const { workOrder } = input;
  const lists = templateLists(input, LAYOUT);
  const keywords = formatKeywords(TEMPLATE_VERSION, workOrder.number);
  await streamWorkbook(stream, { keywords, title: `Work order ${workOrder.number}` }, (writer) => {
    const plain: Partial<AddWorksheetOptions> = {
      views: [{ showGridLines: false }],
      pageSetup: { orientation: 'portrait' },
    };
    const guide = writer.addWorksheet('Guide', options(input, plain));
    guide.columns = [{ width: 3 }, { width: 18 }, { width: 92 }];
    writeGuide(guide, input);
    guide.commit();
    for (const layout of LAYOUT) {
      if (layout.record === 'batch') {
        const sheet = writer.addWorksheet(layout.name, options(input, plain));
        sheet.columns = [{ width: 3, hidden: true }, { width: 22 }, { width: 46 }, { width: 46 }];
        writeBatch(sheet, layout, input);
        sheet.commit();
        continue;
      }
      const frozen = { state: 'frozen', xSplit: 1, ySplit: HEADER_ROWS.hints, showGridLines: false } as const;
      const printTitlesRow = `${HEADER_ROWS.titles}:${HEADER_ROWS.hints}`;
      // On paper the structure's number stands on every page.
      const printed = {
        printTitlesRow,
        printTitlesColumn: 'A:A',
        fitToWidth: pagesAcross(layout.columns.map(widthOf)),
      };
      const sheet = writer.addWorksheet(layout.name, options(input, { views: [frozen], pageSetup: printed }));
      prepareColumns(sheet, layout);
      writeTemplateSheet(sheet, layout, { design: input.design, lists });
      sheet.commit();
    }
    const hidden = writer.addWorksheet(LISTS_SHEET, { state: 'hidden' });
    writeLists(hidden, lists);
    hidden.commit();
  });
}
