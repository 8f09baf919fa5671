import { formatQuantity } from './format-quantity.ts';

/** A pole's words as the server gives them, `40 ft class 4, pine`, with its length in metric where so asked; the class is a name and stays. */
export function poleWords(pole: string, { metric }: { readonly metric: boolean }): string {
  if (!metric) return pole;
  return pole.replace(/^(\d+(?:\.\d+)?) ft\b/, (_, feet: string) =>
    formatQuantity(Number(feet), 'ft', { metric, digits: 1 }),
  );
}
