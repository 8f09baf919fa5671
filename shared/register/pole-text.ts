import type { FieldValues } from '#shared/records/types.ts';

const MATERIAL: Readonly<Record<string, string>> = {
  'southern-pine': 'southern pine',
  'douglas-fir': 'Douglas-fir',
  'western-redcedar': 'western redcedar',
};

/** A pole in the words of the trade, like `40 ft class 4, southern pine`; null where nothing is known of it. */
export function poleText(values: FieldValues): string | null {
  const { poleLengthFt: length, poleClass, poleMaterial } = values;
  const size = [
    typeof length === 'number' ? `${length} ft` : null,
    typeof poleClass === 'string' && poleClass !== 'other' ? `class ${poleClass}` : null,
  ].filter((part) => part !== null);
  const material =
    typeof poleMaterial === 'string' ? (MATERIAL[poleMaterial] ?? poleMaterial.replaceAll('-', ' ')) : null;
  const text = [size.join(' '), material].filter(Boolean).join(', ');
  return text || null;
}
