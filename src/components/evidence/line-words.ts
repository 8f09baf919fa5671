import type { GlyphName } from '#src/components/ui/glyph.tsx';
import { LINE_WORDS } from '#src/components/ui/state-word.tsx';
import { counted } from '#src/lib/formats.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';

const figure = (value: unknown, unit: string, metric: boolean): string | null =>
  typeof value === 'number' ? formatQuantity(value, unit, { metric }) : null;

const classWords = (poleClass: unknown): string | null => {
  if (typeof poleClass !== 'string') return null;
  return poleClass === 'other' ? 'other class' : `cl ${poleClass}`;
};

/** `40 ft cl 4, set`: the thing in few words. */
export function lineWords({ kind, values }: Pick<RecordRow, 'kind' | 'values'>, metric: boolean): string {
  if (kind === 'set') {
    const pole = [figure(values['poleLengthFt'], 'ft', metric), classWords(values['poleClass'])].filter(
      (part) => part !== null,
    );
    return [pole.join(' '), 'set'].filter(Boolean).join(', ');
  }
  if (kind === 'straighten') {
    const lean = figure(values['leanBeforeInPer10Ft'], 'in-per-10ft', metric);
    return lean ? `straighten, lean ${lean}` : 'straighten';
  }
  const long = figure(values['padLengthIn'], 'in', metric);
  const wide = figure(values['padWidthIn'], 'in', metric);
  return long && wide ? `re-level, ${long.replace(/ \D+$/, '')} × ${wide}` : 're-level';
}

/** Glyph and word of a line on the desk: its decision, or what waits on it. */
export function lineState(record: RecordRow): { readonly glyph: GlyphName; readonly word: string } {
  const { state, counts } = record;
  if (state === 'held') return { glyph: 'lozenge', word: 'concession' };
  if (state !== 'undecided') return LINE_WORDS[state];
  const due = counts.nonconformity + counts.query;
  const glyph = counts.nonconformity > 0 ? 'triangle' : counts.query > 0 ? 'circle' : 'dotted';
  if (due === 0) return { glyph, word: 'no findings' };
  if (counts.undecided === 0) return { glyph: 'dotted', word: 'reopened' };
  if (counts.undecided < due) return { glyph, word: `${counts.undecided} of ${due} open` };
  const word = counts.nonconformity > 0 ? counted(due, 'finding') : counted(due, 'query', 'queries');
  return { glyph, word };
}
