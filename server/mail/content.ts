/** A message as data; its plain text and its HTML are both made from it, so that they say the same. */
export type MailContent = {
  readonly subject: string;
  readonly heading: string;
  readonly blocks: readonly MailBlock[];
};

export type MailBlock =
  | { readonly type: 'text'; readonly text: string }
  /** Pairs of a term and its value. */
  | { readonly type: 'facts'; readonly facts: readonly (readonly [string, string])[] }
  /** Every row has as many cells as there are columns. */
  | {
      readonly type: 'table';
      readonly columns: readonly string[];
      readonly rows: readonly (readonly string[])[];
    }
  /** What a person wrote. */
  | { readonly type: 'quote'; readonly by: string; readonly text: string }
  /** To a page of the product: a path that begins with a slash, or its whole address. */
  | { readonly type: 'link'; readonly label: string; readonly path: string };

export type MailTexts = { readonly subject: string; readonly text: string; readonly html: string };
