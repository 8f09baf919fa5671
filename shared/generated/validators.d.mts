// Written by `npm run generate`. Do not edit.
import type { FieldFault } from '../calc/field-fault.ts';

export type RecordName = 'set' | 'straighten' | 'relevel' | 'pour' | 'event' | 'photo' | 'batch';
export type { FieldFault };

/** Faults of one row, one a field; empty when there is none. Never throws. */
export function validateRecord(kind: RecordName, values: unknown): FieldFault[];
export function validateStandard(value: unknown): FieldFault[];
export function validateProduct(value: unknown): FieldFault[];
