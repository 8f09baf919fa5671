import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import type { FindingDraft, LineRule, LineView } from '../types.ts';

/** The reading that each view proves: where the finding points. */
const READING: Readonly<Record<string, string>> = {
  'bore-depth': 'boreDepthFt',
  water: 'waterIn',
  finish: 'foamTopBelowGradeIn',
  plumb: 'leanInPer10Ft',
  brand: 'brandHeightFt',
  before: 'structureNumber',
  after: 'structureNumber',
  'level-after': 'slopeAfterAlongInPerFt',
};

const GAP = { set: 'structureNumber', straighten: 'gapAtGradeIn', relevel: 'gap1In' } as const;

const VIEW_WORDS: Readonly<Record<string, string>> = {
  'bore-depth': 'the tape in the bore (bore-depth)',
  water: 'the water in the bore (water)',
  kits: 'the kit labels with their lot (kits)',
  finish: 'the foam at ground line (finish)',
  plumb: 'the pole plumb (plumb)',
  brand: "the maker's brand (brand)",
  before: 'the structure before work (before)',
  gap: 'the gap (gap)',
  after: 'the structure after work (after)',
  'level-after': 'the level on the pad after work (level-after)',
};

/** The water view proves water; where none was found there is nothing to photograph. */
const isDue = (view: string, line: LineView): boolean =>
  view !== 'water' || !(typeof line.values['waterIn'] === 'number' && line.values['waterIn'] <= 0);

export const photoMissing: LineRule = {
  code: 'photo-missing',
  title: 'Photograph missing',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'structureNumber',
  needs: ['photos'],
  // The views are the standard's own list, which templates and screens read too.
  paramsSchema: paramsSchema({}),
  check: (line) => {
    if (line.photos === null) return [];
    const there = new Set(line.photos.map((photo) => photo.view));
    const { requiredViews, rules } = line.standard.body;
    const due = new Set<string>(requiredViews[line.kind]);
    if (line.kind === 'set' && rules['brand-differs'].on) due.add('brand');
    return [...due]
      .filter((view) => isDue(view, line) && !there.has(view))
      .map((view): FindingDraft => ({
        field: view === 'gap' ? GAP[line.kind] : (READING[view] ?? 'structureNumber'),
        part: view,
        measured: null,
        limit: view,
        margin: null,
        unit: null,
        params: { view },
      }));
  },
  message: ({ limit }) => `There is no photograph of ${VIEW_WORDS[String(limit)] ?? say(limit, null)}.`,
  remedy: () => 'Add the photograph, or match one already handed in to this line and view.',
};
