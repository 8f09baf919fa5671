import type { Batch } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { batchCan } from './batch-can.ts';
import type { BatchDbRow } from './batch-select.ts';
import { isOpen } from './is-open.ts';

/** A batch on the wire. A draft shows the owner's people its number and status only. */
export function presentBatch(row: BatchDbRow, viewer: { actor: Actor; ability: Ability }): Batch {
  const hidden = viewer.actor.orgKind === 'owner' && isOpen(row.status);
  const counts = hidden ? null : row.counts;
  // What an inspector decides is told when the review is closed, and so is how far they are.
  const going = viewer.actor.orgKind === 'contractor' && row.status === 'in-review';
  return {
    id: row.id,
    number: row.number,
    workOrder: { id: row.work_order_id, number: row.work_order_number, title: row.work_order_title },
    contractor: { id: row.contractor_id, name: row.contractor_name },
    status: row.status,
    revision: {
      id: row.revision_id,
      number: row.n,
      dueOn: row.due_on,
      submittedAt: row.submitted_at,
      takenAt: row.taken_at,
      decidedAt: row.decided_at,
      inspector:
        row.inspector_id && row.inspector_name ? { id: row.inspector_id, name: row.inspector_name } : null,
      standards: [...(counts?.standards ?? [])],
    },
    input: row.input,
    workbook: { fileName: hidden ? null : row.file_name, sha256: hidden ? null : row.sha256 },
    counts: {
      lines: counts?.lines ?? (row.n > 0 ? row.returned : 0),
      decided: hidden || going ? 0 : row.decided,
      nonconformity: counts?.nonconformity ?? 0,
      query: counts?.query ?? 0,
      note: counts?.note ?? 0,
      photos: hidden ? 0 : row.photos,
      unplacedPhotos: hidden ? 0 : row.unplaced,
    },
    createdAt: row.created_at,
    version: row.version,
    can: batchCan(row, viewer),
  };
}
