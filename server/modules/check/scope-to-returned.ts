import { kindKey } from '#shared/records/structure-key.ts';
import type { SourceBatch } from '#shared/records/types.ts';
import { notice } from '#shared/workbook/notices.ts';

const NAMED = 5;

/**
 * A later revision takes the returned lines only: others in the workbook are named in a note and no line. Their pours
 * and events stay; the check knows them by the approved siblings. `returned` holds `kind|STRUCTURE`.
 */
export function scopeToReturned(source: SourceBatch, returned: ReadonlySet<string>): SourceBatch {
  const inScope = source.lines.filter((line) => returned.has(kindKey(line.kind, line.structureNumber)));
  const outside = source.lines.filter((line) => !returned.has(kindKey(line.kind, line.structureNumber)));
  if (outside.length === 0) return source;
  const named = [...new Set(outside.map((line) => line.structureNumber))];
  return {
    ...source,
    lines: inScope,
    notices: [
      ...source.notices,
      notice(
        'workbook-not-returned',
        { sheet: outside[0]?.sheet ?? null },
        { structures: named.slice(0, NAMED).join(', '), more: Math.max(0, named.length - NAMED) },
      ),
    ],
  };
}
