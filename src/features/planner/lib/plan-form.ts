import { createContext, useContext } from 'react';
import type { PlanTexts } from '#shared/planner/plan-texts.ts';

export type PlanForm = {
  readonly texts: PlanTexts;
  readonly type: (key: string, text: string) => void;
  readonly settle: () => void;
  readonly faultOf: (key: string) => string | undefined;
  /** What a blank field is taken as: `70`. */
  readonly assumed: Readonly<Record<string, string>>;
};

const PlanFormContext = createContext<PlanForm | null>(null);
export const PlanFormProvider = PlanFormContext.Provider;

export function usePlanForm(): PlanForm {
  const form = useContext(PlanFormContext);
  if (form === null) throw new Error('A field of the planner stands outside its form.');
  return form;
}
