import { createRequire } from 'node:module';
import PdfDocument from 'pdfkit';
import { PAPER_SIZES, type Paper } from './paper.ts';

const resolve = createRequire(import.meta.url).resolve;
const FONTS = {
  regular: resolve('@expo-google-fonts/noto-sans/400Regular/NotoSans_400Regular.ttf'),
  semibold: resolve('@expo-google-fonts/noto-sans/600SemiBold/NotoSans_600SemiBold.ttf'),
};

/** An empty document with its fonts; pages are added by whoever writes them. `madeAt` makes the same bytes of the same sheets. */
export function createPdf(options: {
  readonly paper: Paper;
  readonly title: string;
  readonly author: string;
  readonly madeAt: Date;
  /** For tests that read the pages' commands. */
  readonly compress?: boolean;
}): PDFKit.PDFDocument {
  const { width, height } = PAPER_SIZES[options.paper];
  const doc = new PdfDocument({
    autoFirstPage: false,
    size: [width, height],
    margin: 0,
    tagged: true,
    pdfVersion: '1.7',
    lang: 'en-US',
    displayTitle: true,
    compress: options.compress ?? true,
    info: {
      Title: options.title,
      Author: options.author,
      CreationDate: options.madeAt,
      ModDate: options.madeAt,
    },
  });
  doc.registerFont('regular', FONTS.regular);
  doc.registerFont('semibold', FONTS.semibold);
  return doc;
}
