import { Ajv2020 } from 'ajv/dist/2020.js';
import { describe, expect, it } from 'vitest';
import template from '#schemas/workbook/template.schema.json' with { type: 'json' };
import v1 from '#schemas/workbook/v1.json' with { type: 'json' };
import v2 from '#schemas/workbook/v2.json' with { type: 'json' };
import type { RecordName } from '#shared/generated/validators.mjs';
import { RECORD_FIELDS } from '#shared/records/field-meta.ts';

describe.each([v1, v2])('template version $version', (version) => {
  it('is described as its schema says', () => {
    expect(new Ajv2020().validate(template, version)).toBe(true);
  });

  it('names only fields that the records have', () => {
    for (const sheet of version.sheets) {
      const {
        prefilled = [],
        titles = {},
        keys = {},
      } = sheet as {
        prefilled?: readonly string[];
        titles?: object;
        keys?: object;
      };
      const fields = RECORD_FIELDS[sheet.record as RecordName];
      for (const field of [...prefilled, ...Object.keys(titles), ...Object.keys(keys)]) {
        expect([...fields.keys()]).toContain(field);
      }
    }
  });
});
