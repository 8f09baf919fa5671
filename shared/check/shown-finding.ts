import { renderFinding, type RenderedFinding } from '#shared/findings/render.ts';
import type { Finding } from '#shared/findings/types.ts';

/** A finding with its words, without what only the owner may see. */
export type ShownFinding = Omit<Finding, 'ownerParams'> & RenderedFinding;

/** The words, too, are what is told a contractor: they would name what only the owner may see. */
export const shownFinding = (finding: Finding): ShownFinding => {
  const { ownerParams: _ownerParams, ...shown } = finding;
  return { ...shown, ...renderFinding({ ...shown, ownerParams: {} }) };
};
