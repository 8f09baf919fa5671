import type { Lot } from '#shared/generated/api-types.ts';
import type { Ability } from '#shared/permissions/ability.ts';
import type { LotDbRow } from './lot-select.ts';

export function presentLot(row: LotDbRow, { ability }: { ability: Ability }): Lot {
  return {
    id: row.id,
    number: row.number,
    product: { id: row.product_id, code: row.product },
    expiresOn: row.expires_on,
    status: row.status,
    receivedFt3: row.received_ft3,
    usedFt3: row.used_ft3,
    balanceFt3: row.received_ft3 - row.used_ft3,
    structures: row.structures,
    version: row.version,
    can: ability.can('update', 'Lot') ? movesFrom(row.status) : [],
  };
}

/** A recall is final; a hold ends in release or recall. */
function movesFrom(status: LotDbRow['status']): string[] {
  if (status === 'recalled') return [];
  return status === 'held' ? ['receive', 'release', 'recall'] : ['receive', 'hold', 'recall'];
}
