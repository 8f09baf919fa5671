import { RECORD_FIELDS, type FieldMeta } from '#shared/records/field-meta.ts';
import type { Kind } from '#shared/records/types.ts';
import { heading } from '#shared/workbook/layout.ts';
import { FIELD_GROUPS } from '#src/features/records/components/field-groups.ts';

export type TypedField = FieldMeta & { readonly key: string; readonly label: string };
export type TypedGroup = { readonly title: string; readonly fields: readonly TypedField[] };

const field = (key: string, meta: FieldMeta): TypedField => ({
  ...meta,
  key,
  label: heading(meta.title, meta.unit),
});

/** Fields of a kind in the order in which the work is done; every field of its schema once. */
export function groupsOf(kind: Kind): readonly TypedGroup[] {
  const left = new Map(RECORD_FIELDS[kind]);
  const groups = FIELD_GROUPS[kind].map(({ title, fields }) => ({
    title,
    fields: fields.flatMap((key) => {
      const meta = left.get(key);
      left.delete(key);
      return meta ? [field(key, meta)] : [];
    }),
  }));
  const rest = [...left].map(([key, meta]) => field(key, meta));
  return [...groups, { title: 'Other', fields: rest }].filter(({ fields }) => fields.length > 0);
}

/** The structure is that of the line, and so is the kind. */
const OF_THE_LINE = new Set(['structureNumber', 'kind']);

export const POUR_FIELDS: readonly TypedField[] = [...RECORD_FIELDS.pour].flatMap(([key, meta]) =>
  OF_THE_LINE.has(key) ? [] : [field(key, meta)],
);

/** Ids of the inputs, for labels, findings and the summary's links. */
export const inputId = (pour: number | null, key: string): string =>
  pour === null ? `line-${key}` : `pour-${pour}-${key}`;

const WORDS: Readonly<Record<string, string>> = {
  'not-by-us': 'not by us',
  'not-yet': 'not yet',
  'not-measured': 'not measured',
};
export const typedWord = (word: string): string => WORDS[word] ?? word.replaceAll('-', ' ');
