import { readLengthFt, readLengthIn } from '#shared/workbook/cells/read-length.ts';
import { readQuantity } from '#shared/workbook/cells/read-quantity.ts';
import type { Reading } from '#shared/workbook/cells/reading.ts';
import type { Kind } from '#shared/records/types.ts';
import { PLAN_FIELDS, type PlanField } from './plan-fields.ts';
import type { PlanTexts } from './plan-texts.ts';

/** What is wrong, beside the field that it concerns, in the words shown. */
export type PlanFault = { readonly field: string; readonly text: string };

/** The typed values that can be read: those that cannot are faults and count as blank. */
export type PlanReading = {
  readonly kind: Kind;
  readonly numbers: ReadonlyMap<string, number>;
  readonly words: ReadonlyMap<string, string>;
  readonly sizes: ReadonlyMap<string, readonly number[]>;
  readonly faults: readonly PlanFault[];
};

const MOST_SIZES = 12;

function example({ read, unit }: PlanField): string {
  if (read === 'length-ft') return 'such as 6.5 or 6 ft 6 in';
  if (read === 'length-in') return 'such as 18 or 18 1/2';
  return unit === '' ? 'such as 4' : `in ${unit}, such as 70`;
}

const within = (field: PlanField, value: number) => value >= field.least - 1e-9 && value <= field.most + 1e-9;

const bounds = ({ least, most, unit }: PlanField) => `from ${least} to ${most} ${unit}`.trim();

function readNumber(field: PlanField, text: string): Reading {
  if (field.read === 'length-ft') return readLengthFt(text);
  if (field.read === 'length-in') return readLengthIn(text, 'in');
  return readQuantity(text.replace(/\s*(?:°\s*F|%)$/i, ''), null);
}

const UNIT_NAMES: Readonly<Record<string, string>> = {
  ft: 'feet',
  in: 'inches',
  '%': 'percent',
  deg: 'degrees',
  degC: '°C',
  degF: '°F',
};
const unitName = (unit: string) => UNIT_NAMES[unit] ?? (unit === '' ? 'bare numbers' : unit);

function numberOrFault(field: PlanField, text: string): number | string {
  const reading = readNumber(field, text);
  if ('problem' in reading) {
    const found = String(reading.problem.params['found']);
    return reading.problem.code === 'record-unit'
      ? `“${text}” is in ${unitName(found)}; this field is in ${unitName(field.unit)}.`
      : `“${text}” is no number. Write it ${example(field)}.`;
  }
  if (typeof reading.value !== 'number') return `“${text}” is no number. Write it ${example(field)}.`;
  if (within(field, reading.value)) return reading.value;
  return reading.value <= 0 && field.least > 0
    ? `“${text}” must be above zero: ${bounds(field)}.`
    : `“${text}” is out of range: ${bounds(field)}.`;
}

/** `18, 20; 24 30` as sizes, least first, each once. */
function sizesOrFault(field: PlanField, text: string): readonly number[] | string {
  const parts = text.split(/[\s,;]+/).filter((part) => part !== '');
  if (parts.length > MOST_SIZES) return `At most ${MOST_SIZES} sizes; ${parts.length} are written.`;
  const sizes = new Set<number>();
  for (const part of parts) {
    if (!/^\d{1,3}(?:\.\d{1,4})?$/.test(part))
      return `“${part}” is no size. Write sizes with commas: 18, 20, 24.`;
    const size = Number(part);
    if (!within(field, size)) return `“${part}” is out of range: ${bounds(field)}.`;
    sizes.add(size);
  }
  return [...sizes].sort((a, b) => a - b);
}

/** Reads every field of a kind. Total: what cannot be read is a fault, and the rest is still there. */
export function readPlan(texts: PlanTexts): PlanReading {
  const written = (key: string) => (texts[key] ?? '').trim();
  const kindText = written('kind');
  const kind: Kind = kindText === 'straighten' || kindText === 'relevel' ? kindText : 'set';
  const numbers = new Map<string, number>();
  const words = new Map<string, string>();
  const sizes = new Map<string, readonly number[]>();
  const faults: PlanFault[] = [];
  for (const field of PLAN_FIELDS) {
    const text = written(field.key);
    if (text === '' || !field.kinds.includes(kind)) continue;
    const fault = (words: string) => void faults.push({ field: field.key, text: words });
    if (field.read === 'text') words.set(field.key, text);
    else if (field.read === 'code') {
      if (field.codes.includes(text)) words.set(field.key, text);
      else fault(`“${text}” is not known here. Choose one of the list.`);
    } else if (field.read === 'sizes') {
      const read = sizesOrFault(field, text);
      if (typeof read === 'string') fault(read);
      else sizes.set(field.key, read);
    } else {
      const read = numberOrFault(field, text);
      if (typeof read === 'string') fault(read);
      else numbers.set(field.key, read);
    }
  }
  return { kind, numbers, words, sizes, faults };
}
