import { renderFinding, type RenderedFinding } from '#shared/findings/render.ts';
import type { Finding } from '#shared/findings/types.ts';

/** A finding with its words, without what only the owner may see. */
export type ShownFinding = Omit<Finding, 'ownerParams'> & RenderedFinding;

export const shownFinding = (finding: Finding): ShownFinding => {
  const { ownerParams: _ownerParams, ...shown } = finding;
  return { ...shown, ...renderFinding(finding) };
};
