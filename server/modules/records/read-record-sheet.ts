import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { presentBatch } from '#server/modules/batches/present-batch.ts';
import { readBatch } from '#server/modules/batches/read-batch.ts';
import { photosOfLine } from '#server/modules/photos/list-photos.ts';
import type { RecordSheetData } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { FINDING_SELECT, type FindingDbRow } from './finding-select.ts';
import { listHistory } from './list-history.ts';
import { listPours } from './list-pours.ts';
import { presentFinding } from './present-finding.ts';
import { readEstimates } from './read-estimates.ts';
import { readRecord } from './read-record.ts';
import { titleBlock } from './title-block.ts';

/**
 * One line with all that its sheet shows, whatever revision it belongs to.
 * @throws Problem 404 for another contractor's record as for none
 */
export async function readRecordSheet(
  em: EntityManager,
  options: { id: string; actor: Actor; ability: Ability },
): Promise<RecordSheetData> {
  const { id, actor, ability } = options;
  const record = await readRecord(em, options);
  const kept = await row<{
    raw: Record<string, unknown>;
    events: RecordSheetData['events'];
    batch_id: string;
  }>(
    em,
    'select r.raw, r.events, v.batch_id from records r join revisions v on v.id = r.revision_id where r.id = $1',
    [id],
  );
  if (!kept) throw new Error(`The record ${id} is gone.`);
  const findings = await rows<FindingDbRow>(
    em,
    `${FINDING_SELECT} where f.record_id = $1 order by f.ordinal`,
    [id],
  );
  const batch = await readBatch(em, {
    id: kept.batch_id,
    contractorId: contractorWall(ability, 'read', 'Batch'),
  });
  const registerEntry = await row<{ recordNumber: string; version: number }>(
    em,
    `select record_number as "recordNumber", n as version from register_versions where record_id = $1 order by n desc limit 1`,
    [id],
  );
  const events = kept.events.map(({ event, values }) => ({ event, values }));
  return {
    record,
    cells: kept.raw,
    pours: await listPours(em, id),
    events,
    ...(await readEstimates(em, { record, events })),
    findings: findings.map((finding) => presentFinding(finding, { actor, ability })),
    photos: await photosOfLine(em, { photoIds: record.photos.map((photo) => photo.id), actor, ability }),
    history: await listHistory(em, { lineId: record.lineId, owner: actor.orgKind === 'owner' }),
    batch: presentBatch(batch, { actor, ability }),
    titleBlock: await titleBlock(em, record),
    registerEntry,
  };
}
