import { byText, canonical } from '#shared/records/canonical.ts';
import type { Finding } from '#shared/findings/types.ts';

/** What a finding says, its row apart. */
const content = ({ row: _row, cell: _cell, ...rest }: Finding): string => canonical(rest);

/** Findings that are the same in all but their row get numbers, in an order that rows have no say in. */
export const uniqueFindings = (findings: readonly Finding[]): readonly Finding[] => {
  const same = new Map<string, Finding[]>();
  for (const finding of findings) {
    const group = same.get(finding.fingerprint);
    if (group) group.push(finding);
    else same.set(finding.fingerprint, [finding]);
  }
  return [...same.values()].flatMap((group) => {
    if (group.length === 1) return group;
    const contents = new Map(group.map((finding) => [finding, content(finding)]));
    return group
      .toSorted((a, b) => byText(contents.get(a) ?? '', contents.get(b) ?? '') || (a.row ?? 0) - (b.row ?? 0))
      .map((finding, index) =>
        index === 0 ? finding : { ...finding, fingerprint: `${finding.fingerprint}#${index + 1}` },
      );
  });
};
