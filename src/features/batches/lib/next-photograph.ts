import type { LineView } from './line-view.ts';
import { viewWord } from '#shared/records/photo-views.ts';

export type MissingPhotograph = {
  readonly structureNumber: string;
  readonly view: string;
  /** `17-0426, bore depth` */
  readonly label: string;
  /** By this name the server places it on its line. */
  readonly fileName: string;
};

/** The views that the check still misses, in the order of the lines; those in `taken` are on their way. */
export function missingPhotographs(
  lines: readonly LineView[],
  taken: ReadonlySet<string> = new Set(),
): MissingPhotograph[] {
  return lines.flatMap(({ record, findings }) =>
    findings.flatMap((finding) => {
      const view = finding.params['view'];
      if (finding.code !== 'photo-missing' || typeof view !== 'string') return [];
      const fileName = `${record.structureNumber} ${view}.jpg`;
      if (taken.has(fileName)) return [];
      const { structureNumber } = record;
      return [{ structureNumber, view, fileName, label: `${structureNumber}, ${viewWord(view)}` }];
    }),
  );
}
