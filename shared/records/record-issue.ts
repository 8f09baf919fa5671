import type { Params, Severity } from '#shared/findings/types.ts';
import type { FieldMeta } from './field-meta.ts';
import type { Scalar } from './types.ts';

/** What keeps a row from being a record: becomes a `record-…` finding. A nonconformity unless it says otherwise. */
export type RecordIssue = {
  readonly code: string;
  readonly severity?: Severity;
  readonly field: string | null;
  readonly measured: Scalar;
  readonly limit: number | string | null;
  readonly margin: number | null;
  readonly unit: string | null;
  readonly params: Params;
};

/** What a sentence needs to say what is expected in a field. */
export const expectedParams = (meta: FieldMeta | undefined): Params =>
  meta === undefined
    ? {}
    : {
        title: meta.title,
        read: meta.read,
        ...(meta.unit === null ? {} : { unit: meta.unit }),
        ...(meta.minimum === null ? {} : { minimum: meta.minimum }),
        ...(meta.maximum === null ? {} : { maximum: meta.maximum }),
        ...(meta.maxLength === null ? {} : { maxLength: meta.maxLength }),
        ...(meta.allowed === null ? {} : { allowed: meta.allowed }),
        ...(meta.words.length === 0 ? {} : { words: meta.words }),
      };
