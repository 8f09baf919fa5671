import { paths } from '#src/config/paths.ts';
import type { Place } from './use-plan-texts.ts';
import { sharedTexts, writePlanTexts, type PlanTexts } from '#shared/planner/plan-texts.ts';

/** A link into the planner that carries what is assumed alike. */
export function plannerAddress(place: Place, texts: PlanTexts = {}): string {
  const search = writePlanTexts(new URLSearchParams(), sharedTexts(texts));
  for (const [name, value] of Object.entries(place)) if (value) search.set(name, value);
  search.sort();
  return `${paths.planner.to()}?${search}`;
}
