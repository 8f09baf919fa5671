import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRowsReturning } from '#server/db/insert-rows.ts';
import { rows, run } from '#server/db/rows.ts';
import { conflict, problem } from '#server/http/problem.ts';
import { appendTrailMany } from '#server/trail/append-trail-many.ts';
import { writeOutcomes } from '#server/modules/review/write-outcomes.ts';
import type { RegisterEntriesReply } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { findStructures } from './find-structures.ts';
import { lockLines, type EnteringLine } from './lock-lines.ts';
import { putDecidedOnRecord } from './put-decided-on-record.ts';

type CurrentVersion = {
  structure_id: string;
  kind: string;
  version_id: string;
  record_number: string;
  n: number;
};
type MadeVersion = { id: string; record_id: string; record_number: string; n: number };

/**
 * Enters approved lines on the register, all or nothing. A structure already on record gets its next version, which
 * wants a reason; the version before stays as it is.
 * @throws Problem 404; 409 naming what is not approved or entered twice; 422 when a reason is due
 */
export async function enterRecords(
  em: EntityManager,
  options: { recordIds: readonly string[]; reason: string | null; actor: Actor },
): Promise<RegisterEntriesReply> {
  const { actor } = options;
  const recordIds = [...new Set(options.recordIds)];
  return em.transactional(async (tx) => {
    const lines = await lockLines(tx, recordIds);
    const structures = await findStructures(tx, lines);
    refuseTwins(lines, structures);
    const current = await lockCurrent(tx, [...structures.values()]);
    const reason = supersedeReason(lines, { structures, current, reason: options.reason });
    const made = await writeVersions(tx, { lines, structures, current, reason, actor });
    await markOnRecord(tx, lines, actor);
    await appendTrailMany(
      tx,
      made.map((version) => ({
        actor,
        action: version.n === 1 ? 'register.entered' : 'register.superseded',
        subject: { type: 'register', id: version.id, label: version.record_number },
        payload: { record: version.record_id, version: version.n, ...(version.n > 1 ? { reason } : {}) },
      })),
    );
    await putDecidedOnRecord(tx, [...new Set(lines.map((line) => line.revision_id))], actor);
    return {
      entries: made.map((version) => ({
        id: version.id,
        recordId: version.record_id,
        recordNumber: version.record_number,
        version: version.n,
      })),
    };
  });
}

const keyOf = (structureId: string | undefined, kind: string): string => `${structureId}|${kind}`;

function refuseTwins(lines: readonly EnteringLine[], structures: ReadonlyMap<string, string>): void {
  const seen = new Set<string>();
  for (const line of lines) {
    const key = keyOf(structures.get(line.record_id), line.kind);
    if (seen.has(key))
      throw conflict(
        'register.twice',
        `${line.structure_number} stands twice in what is to be entered. Enter one line of it.`,
      );
    seen.add(key);
  }
}

async function lockCurrent(
  em: EntityManager,
  structureIds: readonly string[],
): Promise<Map<string, CurrentVersion>> {
  await rows(em, 'select id from structures where id = any($1::uuid[]) order by id for update', [
    structureIds,
  ]);
  const found = await rows<CurrentVersion>(
    em,
    `select c.structure_id, c.kind, c.version_id, c.record_number, v.n
     from register_current c join register_versions v on v.id = c.version_id where c.structure_id = any($1::uuid[])`,
    [structureIds],
  );
  return new Map(found.map((version) => [keyOf(version.structure_id, version.kind), version]));
}

function supersedeReason(
  lines: readonly EnteringLine[],
  known: {
    structures: ReadonlyMap<string, string>;
    current: ReadonlyMap<string, CurrentVersion>;
    reason: string | null;
  },
): string | null {
  const reason = known.reason?.trim() || null;
  const supersedes = lines.filter((line) =>
    known.current.has(keyOf(known.structures.get(line.record_id), line.kind)),
  );
  if (supersedes.length === 0 || reason) return reason;
  const names = supersedes
    .map((line) => line.structure_number)
    .slice(0, 5)
    .join(', ');
  throw problem(
    422,
    'register.reason-required',
    `${names}: already on record. Say why a new version supersedes the old one.`,
    {
      errors: [
        {
          pointer: '/reason',
          code: 'register.reason-required',
          detail: 'Say why a new version supersedes the old one.',
        },
      ],
    },
  );
}

async function writeVersions(
  em: EntityManager,
  options: {
    lines: readonly EnteringLine[];
    structures: ReadonlyMap<string, string>;
    current: ReadonlyMap<string, CurrentVersion>;
    reason: string | null;
    actor: Actor;
  },
): Promise<MadeVersion[]> {
  const { lines, structures, current, reason, actor } = options;
  const numbers = await rows<{ number: string }>(
    em,
    `select human_number('R', nextval('record_numbers'), 6) as number from generate_series(1, $1::int)`,
    [lines.length],
  );
  const made = await insertRowsReturning<MadeVersion>(em, {
    table: 'register_versions',
    list: lines.map((line, index) => {
      const structureId = structures.get(line.record_id);
      const before = current.get(keyOf(structureId, line.kind));
      return {
        id: crypto.randomUUID(),
        structure_id: structureId,
        kind: line.kind,
        n: (before?.n ?? 0) + 1,
        record_number: before?.record_number ?? numbers[index]?.number,
        record_id: line.record_id,
        supersedes_id: before?.version_id ?? null,
        reason: before ? reason : null,
        structure_number: line.structure_number,
        work_order_id: line.work_order_id,
        contractor_id: line.contractor_id,
        work_day: line.work_day,
        fill_ratio: line.fill_ratio,
        latitude: line.latitude,
        longitude: line.longitude,
        nonconforming: line.conceded.length > 0,
        rule_codes: line.conceded,
        entered_by: actor.id,
        entered_at: new Date().toISOString(),
      };
    }),
    returning: ['id', 'record_id', 'record_number', 'n'],
  });
  await run(
    em,
    `insert into register_current (structure_id, kind, version_id, record_number)
     select structure_id, kind, id, record_number from register_versions where id = any($1::uuid[])
     on conflict (structure_id, kind) do update set version_id = excluded.version_id, suspended = false`,
    [made.map((version) => version.id)],
  );
  const order = new Map(lines.map((line, index) => [line.record_id, index]));
  return made.toSorted((a, b) => (order.get(a.record_id) ?? 0) - (order.get(b.record_id) ?? 0));
}

async function markOnRecord(em: EntityManager, lines: readonly EnteringLine[], actor: Actor): Promise<void> {
  await run(em, `update lines set state = 'on-record', version = version + 1 where id = any($1::uuid[])`, [
    lines.map((line) => line.line_id),
  ]);
  await writeOutcomes(em, {
    lines: lines.map((line) => ({
      id: line.line_id,
      recordId: line.record_id,
      revisionId: line.revision_id,
      state: 'on-record',
    })),
    actorId: actor.id,
    reason: null,
  });
}
