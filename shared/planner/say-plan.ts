import { formatQuantity } from '#shared/units/format-quantity.ts';

/** Options of a sentence: metric where the reader chose so. */
export type SayOptions = { readonly metric?: boolean };

/** A planned figure in a sentence: tenths of an inch, hundredths of a foot. */
export const sayIn = (value: number, { metric = false }: SayOptions = {}): string =>
  formatQuantity(value, 'in', { metric, digits: metric ? 0 : 1 });

export const sayFt = (value: number, { metric = false }: SayOptions = {}): string =>
  formatQuantity(value, 'ft', { metric });

export const sayFt3 = (value: number, { metric = false }: SayOptions = {}): string =>
  formatQuantity(value, 'ft3', { metric });
