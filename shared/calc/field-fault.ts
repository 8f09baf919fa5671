/** What is wrong with one field, in the words of JSON Schema (`required`, `minimum`, `enum`, `type` …). Null field: the row as a whole. */
export type FieldFault = {
  readonly field: string | null;
  readonly keyword: string;
  readonly params: Readonly<Record<string, unknown>>;
};
