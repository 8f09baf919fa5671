import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import type { TitleBlock } from '#shared/generated/api-types.ts';
import type { Kind } from '#shared/records/types.ts';
import type { LineState } from '#shared/review/states.ts';

type Sheet = {
  n: number;
  work_order: string;
  owner: string | null;
  standard_n: number | null;
  ordinal: number;
  lines: number;
};
type Line = {
  id: string;
  kind: Kind;
  structureNumber: string;
  state: LineState;
  workDay: string | null;
  values: Readonly<Record<string, unknown>>;
};

const KIND_WORD: Readonly<Record<Kind, string>> = {
  set: 'Set',
  straighten: 'Straighten',
  relevel: 'Re-level',
};
const STATE_WORD: Readonly<Record<LineState, string>> = {
  undecided: 'not yet',
  approved: 'approved',
  returned: 'returned',
  held: 'held',
  'on-record': 'on record',
  abandoned: 'abandoned',
};

/** When the thing was done, by kind: the first of these that is written. */
const DONE_AT: Readonly<Record<Kind, readonly string[]>> = {
  set: ['setAt', 'letGoAt', 'boredAt'],
  straighten: ['pulledAt', 'releasedAt'],
  relevel: ['raisedAt', 'loweredAt'],
};

/** The title block of a record sheet, as it stands in the corner of a drawing. `measuredOn` is a wall clock or a day. */
export async function titleBlock(em: EntityManager, line: Line): Promise<TitleBlock> {
  const sheet = await row<Sheet>(
    em,
    `select v.n, w.number as work_order, s.n as standard_n, r.ordinal,
       (select count(*)::int from records x where x.run_id = r.run_id) as lines,
       (select name from organisations where kind = 'owner' order by created_at, id limit 1) as owner
     from records r join revisions v on v.id = r.revision_id join batches b on b.id = v.batch_id
     join work_orders w on w.id = b.work_order_id left join standard_versions s on s.id = r.standard_id
     where r.id = $1`,
    [line.id],
  );
  return {
    owner: sheet?.owner ?? '',
    workOrder: sheet?.work_order ?? '',
    structure: line.structureNumber,
    kind: kindOf(line),
    pole: poleOf(line.values),
    measuredOn: doneAt(line),
    standard: sheet?.standard_n ? String(sheet.standard_n) : 'none',
    revision: sheet ? String(sheet.n) : '',
    decided: STATE_WORD[line.state],
    sheet: sheet ? `${sheet.ordinal} of ${sheet.lines}` : '',
  };
}

/** `Set, soil`. */
function kindOf({ kind, values }: Line): string {
  const { ground } = values;
  return typeof ground === 'string' ? `${KIND_WORD[kind]}, ${ground.replaceAll('-', ' ')}` : KIND_WORD[kind];
}

function doneAt({ kind, values, workDay }: Line): string | null {
  const written = DONE_AT[kind].map((field) => values[field]);
  const clock = written.find((value) => typeof value === 'string' && /^\d{4}-\d{2}-\d{2}T/.test(value));
  return typeof clock === 'string' ? clock : workDay;
}

/** `40 ft class 4, pine`; null where neither length nor class is written. */
function poleOf(values: Readonly<Record<string, unknown>>): string | null {
  const { poleLengthFt, poleClass, poleMaterial } = values;
  const size = [
    typeof poleLengthFt === 'number' ? `${poleLengthFt} ft` : null,
    typeof poleClass === 'string' && poleClass !== 'other' ? `class ${poleClass}` : null,
  ].filter((part) => part !== null);
  // The corner of a drawing has room for the wood, not for where it grew.
  const material = typeof poleMaterial === 'string' ? (poleMaterial.split('-').at(-1) ?? null) : null;
  const parts = [size.join(' '), material].filter(Boolean);
  return parts.length === 0 ? null : parts.join(', ');
}
