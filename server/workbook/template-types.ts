import type { Kind } from '#shared/records/types.ts';

/** A planned structure: what of its design is known goes into the prefilled columns of its kind's sheet. */
export type TemplateDesign = {
  readonly structureNumber: string;
  readonly kind: Kind;
  readonly poleLengthFt?: number | null;
  readonly poleClass?: string | null;
  readonly poleMaterial?: string | null;
  readonly structureUse?: string | null;
  readonly ground?: string | null;
  readonly designRakeInPer10Ft?: number | null;
  readonly designRakeAzimuthDeg?: number | null;
  readonly padLengthIn?: number | null;
  readonly padWidthIn?: number | null;
};

export type TemplateInput = {
  readonly workOrder: { readonly number: string; readonly title: string; readonly zone: string };
  readonly contractor: string;
  readonly owner: string;
  readonly design: readonly TemplateDesign[];
  readonly products: readonly { readonly code: string; readonly kitsFt3?: readonly number[] }[];
  readonly lots: readonly { readonly number: string }[];
  /** Number of the owner's standard in force, for the guide. */
  readonly standardNumber: number;
};
