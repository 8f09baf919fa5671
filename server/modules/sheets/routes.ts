import { pipeline } from 'node:stream/promises';
import sheetFileBodySchema from '#schemas/api/sheet-file-body.schema.json' with { type: 'json' };
import sheetFileSchema from '#schemas/api/sheet-file.schema.json' with { type: 'json' };
import { defineRoute, type Route } from '#server/http/define-route.ts';
import { conflict } from '#server/http/problem.ts';
import type { SheetFile, SheetFileBody } from '#shared/generated/api-types.ts';
import { PAPERS, type Paper } from './paper.ts';
import { requestSheets } from './request-sheets.ts';
import { sendSheet } from './send-sheet.ts';
import { presentSheetFile, readSheetFile } from './sheet-file-select.ts';

export const sheetRoutes: readonly Route[] = [
  defineRoute<{ query: { paper?: Paper } }>({
    method: 'get',
    path: '/api/records/:id/sheet.pdf',
    summary: 'The record sheet of one line as a PDF, on US Letter unless A4 is asked for',
    permission: { action: 'read', subject: 'Record' },
    query: { paper: { type: 'string', enum: PAPERS } },
    raw: true,
    produces: 'application/pdf',
    handler: ({ em, params, query, actor, ability, res }) =>
      sendSheet(em, { id: params.id, paper: query.paper ?? 'letter', actor, ability, res }),
  }),
  defineRoute<{ body: SheetFileBody; reply: SheetFile }>({
    method: 'post',
    path: '/api/batches/:id/sheets',
    summary: 'Make one PDF of the record sheets of a batch',
    permission: { action: 'read', subject: 'Batch' },
    body: sheetFileBodySchema,
    reply: sheetFileSchema,
    creates: true,
    status: 202,
    handler: async ({ em, params, body, actor, ability }) => {
      const id = await requestSheets(em, { batchId: params.id, body, actor, ability });
      return presentSheetFile(await readSheetFile(em, id, actor));
    },
  }),
  defineRoute<{ reply: SheetFile }>({
    method: 'get',
    path: '/api/sheets/:id',
    summary: 'A file of record sheets that one asked for',
    permission: { action: 'read', subject: 'Batch' },
    reply: sheetFileSchema,
    handler: async ({ em, params, actor }) => presentSheetFile(await readSheetFile(em, params.id, actor)),
  }),
  defineRoute({
    method: 'get',
    path: '/api/sheets/:id/file',
    summary: 'The PDF itself',
    permission: { action: 'read', subject: 'Batch' },
    raw: true,
    produces: 'application/pdf',
    handler: async ({ em, params, actor, services, res }) => {
      const file = await readSheetFile(em, params.id, actor);
      if (file.state !== 'ready' || !file.sha256)
        throw conflict('sheets.not-ready', 'These sheets are not written yet.');
      const stored = await services.blobs.openRead(file.sha256);
      res
        .type('application/pdf')
        .attachment(file.file_name)
        .set({ 'Content-Length': String(file.size), 'Cache-Control': 'private, no-store' });
      await pipeline(stored, res);
    },
  }),
];
