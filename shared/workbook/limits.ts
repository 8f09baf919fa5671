/** What one workbook may hold. Far above any real batch (2,000 structures), far below what a process can bear. */
export type ReaderLimits = typeof READER_LIMITS;

export const READER_LIMITS = {
  /** Bytes of the file as uploaded. */
  fileBytes: 50_000_000,
  zipEntries: 2_000,
  /** Inflated bytes of one part and of all parts, counted while inflating. */
  partBytes: 200_000_000,
  totalBytes: 400_000_000,
  /** Inflated to packed size; looked at only for parts over `ratioFromBytes` (real workbooks reach 121). */
  ratio: 200,
  ratioFromBytes: 5_000_000,
  sheets: 250,
  /** Characters of a sheet's name; Excel itself allows 31. */
  sheetName: 255,
  /** Relationships of the workbook, content types. */
  partNames: 10_000,
  /** Cell styles and number formats; Excel itself allows 65,490. */
  styles: 100_000,
  rows: 200_000,
  cells: 1_000_000,
  sharedStrings: 500_000,
  /** Characters of the table of shared strings, and of all cells handed on (a string used twice counts twice). */
  characters: 20_000_000,
  /** Characters of one cell; Excel itself allows 32,767. */
  cellCharacters: 100_000,
  /** Merged ranges of all sheets. */
  mergedRanges: 50_000,
  /** Characters of the keywords in the file's properties. */
  keywords: 10_000,
  xmlDepth: 100,
  /** Characters of XML since the last tag or text was complete: a single text node is held whole in memory. */
  xmlSilence: 1_000_000,
} as const;
