import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound, problem } from '#server/http/problem.ts';
import type { Ability, Actor, SubjectName } from '#shared/permissions/ability.ts';

const UUID = /^[0-9a-f]{8}-(?:[0-9a-f]{4}-){3}[0-9a-f]{12}$/i;

type Kind = {
  readonly needs: SubjectName;
  readonly sql: string;
  /** `$2` is who asks: it is theirs alone. */
  readonly own?: boolean;
};

/** `$1` the id, `$2` the wall. A check is its revision's. */
const KINDS: Readonly<Record<string, Kind>> = {
  check: {
    needs: 'Batch',
    sql: `select v.id, v.id as revision_id from revisions v join batches b on b.id = v.batch_id
          where v.id = $1 and ($2::uuid is null or b.contractor_id = $2)`,
  },
  batch: {
    needs: 'Batch',
    sql: `select b.id, v.id as revision_id from batches b
          join lateral (select id from revisions where batch_id = b.id order by n desc limit 1) v on true
          where b.id = $1 and ($2::uuid is null or b.contractor_id = $2)`,
  },
  // Photographs of a batch, while their pictures are made; what is in a draft is its contractor's.
  photos: {
    needs: 'Photo',
    sql: `select b.id from batches b where b.id = $1 and ($2::uuid is null or b.contractor_id = $2)`,
  },
  // Transmittals belong to no contractor: the right to read them is the whole of the wall.
  transmittal: {
    needs: 'Transmittal',
    sql: 'select id from transmittals where id = $1 and $2::uuid is null',
  },
  sheets: {
    needs: 'Batch',
    own: true,
    sql: 'select id from sheet_files where id = $1 and requested_by = $2',
  },
};

export type EventSubject = {
  /** Row of `job_progress` that tells of it. */
  readonly progress: string;
  /** The owner's people learn that a draft is checked, not what was found. */
  readonly hideProblem: boolean;
};

/**
 * What may be followed under this name by this person.
 * @throws Problem 400 for a name that is none; 403; 404 for another contractor's as for nothing
 */
export async function readSubject(
  em: EntityManager,
  asked: { readonly subject: string; readonly actor: Actor; readonly ability: Ability },
): Promise<EventSubject> {
  const { subject, actor, ability } = asked;
  const [name = '', id = ''] = subject.split(':', 2);
  const kind = Object.hasOwn(KINDS, name) ? KINDS[name] : undefined;
  if (!kind || !UUID.test(id))
    throw problem(
      400,
      'subject.unknown',
      'Follow check:<id>, batch:<id>, photos:<batch id>, transmittal:<id> or sheets:<id>.',
      {
        errors: [
          { pointer: '#/query/subject', code: 'subject.unknown', detail: 'There is no such subject.' },
        ],
      },
    );
  const wall = contractorWall(ability, 'read', kind.needs);
  const found = await row<{ id: string; revision_id?: string }>(em, kind.sql, [
    id,
    kind.own ? actor.id : wall,
  ]);
  if (!found) throw notFound();
  return {
    progress: found.revision_id === undefined ? `${name}:${found.id}` : `check:${found.revision_id}`,
    hideProblem: name !== 'transmittal' && name !== 'sheets' && actor.orgKind === 'owner',
  };
}
