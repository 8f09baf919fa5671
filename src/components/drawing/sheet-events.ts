import { createContext, useContext } from 'react';

/** Links balloons and list: which finding is marked, and who to tell. */
export type SheetEvents = {
  readonly active: string | null;
  /** Undefined: a sheet that only shows (print, register). */
  readonly onActive?: (findingId: string | null) => void;
  readonly onPick?: (findingId: string) => void;
};

export const SheetEventsContext = createContext<SheetEvents>({ active: null });

export function useSheetEvents(): SheetEvents {
  return useContext(SheetEventsContext);
}
