import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import type { TitleBlock } from '#shared/generated/api-types.ts';
import { SHEET_OF_KIND, type Kind } from '#shared/records/types.ts';
import type { LineState } from '#shared/review/states.ts';

type Sheet = {
  batch_number: string;
  n: number;
  work_order: string;
  title: string;
  owner: string | null;
  standard_n: number | null;
  effective_on: string | null;
};
type Line = {
  id: string;
  kind: Kind;
  structureNumber: string;
  sheet: string;
  row: number;
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
  undecided: 'Not decided',
  approved: 'Approved',
  returned: 'Returned',
  held: 'Held for a concession',
  'on-record': 'On record',
  abandoned: 'Abandoned',
};

/** The title block of a record sheet, as it stands in the corner of a drawing. */
export async function titleBlock(em: EntityManager, line: Line): Promise<TitleBlock> {
  const sheet = await row<Sheet>(
    em,
    `select b.number as batch_number, v.n, w.number as work_order, w.title, s.n as standard_n, s.effective_on,
       (select name from organisations where kind = 'owner' order by created_at, id limit 1) as owner
     from records r join revisions v on v.id = r.revision_id join batches b on b.id = v.batch_id
     join work_orders w on w.id = b.work_order_id left join standard_versions s on s.id = r.standard_id
     where r.id = $1`,
    [line.id],
  );
  return {
    owner: sheet?.owner ?? '',
    workOrder: sheet ? `${sheet.work_order} ${sheet.title}` : '',
    structure: line.structureNumber,
    kind: KIND_WORD[line.kind],
    pole: poleOf(line.values),
    measuredOn: line.workDay,
    standard: sheet?.standard_n
      ? `Version ${sheet.standard_n}, in force from ${sheet.effective_on ?? ''}`
      : 'None',
    revision: sheet ? `${sheet.batch_number}, revision ${sheet.n}` : '',
    decided: STATE_WORD[line.state],
    sheet: `${line.sheet || SHEET_OF_KIND[line.kind]}, row ${line.row}`,
  };
}

/** `40 ft class 4 southern-pine`; null where neither length nor class is written. */
function poleOf(values: Readonly<Record<string, unknown>>): string | null {
  const { poleLengthFt, poleClass, poleMaterial } = values;
  const parts = [
    typeof poleLengthFt === 'number' ? `${poleLengthFt} ft` : null,
    typeof poleClass === 'string' && poleClass !== 'other' ? `class ${poleClass}` : null,
    typeof poleMaterial === 'string' ? poleMaterial.replaceAll('-', ' ') : null,
  ].filter((part) => part !== null);
  return parts.length === 0 ? null : parts.join(' ');
}
