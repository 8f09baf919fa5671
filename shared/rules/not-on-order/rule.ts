import { kindKey } from '#shared/records/structure-key.ts';
import { SHEET_OF_KIND } from '#shared/records/types.ts';
import { say } from '#shared/findings/say.ts';
import { designIndex } from '../design-index.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const notOnOrder: LineRule = {
  code: 'not-on-order',
  title: 'Not on the work order',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'structureNumber',
  needs: ['design'],
  paramsSchema: paramsSchema({}),
  check: (line, _params, { design }) =>
    design === null ||
    line.broken.has('structureNumber') ||
    designIndex(design).has(kindKey(line.kind, line.structureNumber))
      ? []
      : [{ measured: line.structureNumber, limit: null, margin: null, unit: null }],
  message: ({ measured, kind }) =>
    `Structure ${say(measured, null)} is not planned on this work order for the sheet ${kind === null ? 'it stands on' : SHEET_OF_KIND[kind]}.`,
  remedy: () =>
    'Correct the structure number or move the line to the right sheet; added work needs an amendment of the order.',
};
