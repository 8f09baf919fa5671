import { useEffect, useState } from 'react';
import { KINDS, type Kind } from '#shared/records/types.ts';
import type { TypedValues } from '#shared/workbook/typed-workbook.ts';

export type TypedDraft = {
  readonly kind: Kind;
  readonly values: TypedValues;
  readonly pours: readonly TypedValues[];
};

export const NEW_POUR: TypedValues = { pourNumber: '1' };
const EMPTY: TypedDraft = { kind: 'set', values: {}, pours: [NEW_POUR] };

const isValues = (value: unknown): value is TypedValues =>
  typeof value === 'object' && value !== null && Object.values(value).every((one) => typeof one === 'string');

function read(key: string): TypedDraft {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(key) ?? 'null');
    if (typeof kept !== 'object' || kept === null) return EMPTY;
    const { kind, values, pours } = kept as Partial<Record<keyof TypedDraft, unknown>>;
    const known = KINDS.find((one) => one === kind);
    if (!known || !isValues(values) || !Array.isArray(pours) || !pours.every(isValues)) return EMPTY;
    return { kind: known, values, pours };
  } catch {
    return EMPTY;
  }
}

/** What was typed, kept on this device until it is cleared. */
export function useTypedDraft(userId: string, orderId: string) {
  const key = `upstand.typed-line.${userId}.${orderId}`;
  const [draft, setDraft] = useState<TypedDraft>(() => read(key));
  useEffect(() => {
    try {
      if (draft === EMPTY) localStorage.removeItem(key);
      else localStorage.setItem(key, JSON.stringify(draft));
    } catch {
      // Storage is full or closed: the page itself still holds what was typed.
    }
  }, [draft, key]);
  return { draft, setDraft, clear: () => setDraft(EMPTY), isEmpty: draft === EMPTY };
}
