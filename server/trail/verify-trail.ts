import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';

export type TrailFault = {
  readonly seq: number;
  /**
   * `changed`: the row does not have the hash of its content. `missing-before`: rows between it and the one before are
   * gone. `link-broken`: it does not follow the row before it. `end-differs`: rows after the last one are gone, or were put there.
   */
  readonly fault: 'changed' | 'missing-before' | 'link-broken' | 'end-differs';
};

export type TrailVerdict = {
  readonly intact: boolean;
  readonly entries: number;
  /** Of the last entry; written down elsewhere, it proves later that the chain up to it is the same. */
  readonly headSeq: number;
  readonly headHash: string;
  /** The first ones. */
  readonly faults: readonly TrailFault[];
};

/** Walks the whole chain in the database. */
export async function verifyTrail(em: EntityManager): Promise<TrailVerdict> {
  return em.transactional(async (tx) => {
    // One snapshot for all three statements: an entry that arrives meanwhile is no fault.
    await rows(tx, 'set transaction isolation level repeatable read, read only');
    const faults = await rows<TrailFault>(tx, 'select seq, fault from trail_faults(20)');
    const head = await row<{ entries: number; headSeq: number; headHash: string }>(
      tx,
      `select (select count(*) from trail) as entries, seq as "headSeq", hash as "headHash" from trail_head`,
    );
    if (head === null) {
      return {
        intact: false,
        entries: 0,
        headSeq: 0,
        headHash: '',
        faults: [{ seq: 0, fault: 'end-differs' }],
      };
    }
    return { intact: faults.length === 0, ...head, faults };
  });
}
