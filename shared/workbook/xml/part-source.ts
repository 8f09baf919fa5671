/** Where the parts of a workbook come from: a zip file on the server, the browser's own inflating elsewhere. Names in lower case with forward slashes. */
export type PartSource = {
  readonly names: readonly string[];
  readonly has: (name: string) => boolean;
  readonly open: (name: string) => AsyncIterable<Uint8Array>;
};
