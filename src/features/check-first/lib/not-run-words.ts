import type { NotRun } from '#src/workers/check/protocol.ts';

const WORDS: Readonly<Record<NotRun['reason'], string>> = {
  off: 'Off in the owner’s standard',
  'no-time': 'The time of hand-in is not known here',
  'no-lots': 'The lots are not known here',
  'no-lot-use': 'Needs the use of the lot by all contractors; runs when the workbook is uploaded',
  'no-design': 'The design list is not known here',
  'no-register': 'Needs the register; runs when the workbook is uploaded',
  'no-area': 'The area of the work order is not known here',
  'no-photos': 'Needs the photographs; runs when they are uploaded',
  'no-siblings': 'Needs the earlier revisions; runs when the workbook is uploaded',
  'no-earlier-check': 'Compares with an earlier upload; runs when the workbook is uploaded',
  'own-only': 'Ran on your own structures alone; those of others are looked at when the workbook is uploaded',
};

export type NotRunGroup = { readonly reason: string; readonly titles: readonly string[] };

/** Rules that did not run, by the reason. */
export function groupNotRun(notRun: readonly NotRun[]): readonly NotRunGroup[] {
  const groups = new Map<string, string[]>();
  for (const { reason, title, standards } of notRun) {
    const named = standards ? `${title} (version ${standards.join(' and ')} only)` : title;
    const titles = groups.get(WORDS[reason]);
    if (titles) titles.push(named);
    else groups.set(WORDS[reason], [named]);
  }
  return [...groups].map(([reason, titles]) => ({ reason, titles }));
}
