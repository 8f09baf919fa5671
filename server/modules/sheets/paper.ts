export const PAPERS = ['letter', 'a4'] as const;
export type Paper = (typeof PAPERS)[number];

export type PaperSize = { readonly width: number; readonly height: number };

/** Points of a 72nd of an inch: US Letter 8.5 × 11 in; A4 210 × 297 mm (ISO 216). */
export const PAPER_SIZES: Readonly<Record<Paper, PaperSize>> = {
  letter: { width: 612, height: 792 },
  a4: { width: 595.28, height: 841.89 },
};

export const MARGIN = 34;
