import type { CleanRow } from '#shared/records/clean-row.ts';
import { kindKey, lineKey } from '#shared/records/structure-key.ts';
import { KINDS, type Kind } from '#shared/records/types.ts';
import { designIndex } from '#shared/rules/design-index.ts';
import type { CheckContext, DesignFact, PhotoFact } from '#shared/rules/types.ts';

type Named = { readonly kind: Kind; readonly structureNumber: string };

/** Does the row belong to an approved line of an earlier revision of this batch? */
export const isSibling = ({ siblings }: CheckContext, row: CleanRow): boolean =>
  siblings !== null && KINDS.some((kind) => siblings.has(kindKey(kind, row.values['structureNumber'])));

export const photosOf = (
  { photos }: CheckContext,
  line: Named & { readonly occurrence: number },
): readonly PhotoFact[] | null =>
  photos === null ? null : (photos.get(lineKey(line.kind, line.structureNumber, line.occurrence)) ?? []);

export const designOf = ({ design }: CheckContext, line: Named): DesignFact | null =>
  design === null ? null : (designIndex(design).get(kindKey(line.kind, line.structureNumber)) ?? null);
