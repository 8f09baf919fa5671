import { canonical } from './canonical.ts';
import type { SourceRow } from './types.ts';

/** What a row says, its place apart: equal for rows that say the same. */
export const rowContent = ({ values, cells }: SourceRow): string => {
  const raw = Object.fromEntries(Object.entries(cells).map(([field, cell]) => [field, cell.raw]));
  return `${canonical(values)} ${canonical(raw)}`;
};
