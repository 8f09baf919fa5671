import { readFile } from 'node:fs/promises';
import { geoAreaOf } from '#shared/calc/geo-area.ts';
import { checkBatch } from '#shared/check/check-batch.ts';
import { checkBeforeHandIn } from '#shared/check/check-before-hand-in.ts';
import type { OrderContextData } from '#shared/check/context-from-data.ts';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { contextBeside } from '#shared/check/known-beside.ts';
import type { CheckResult } from '#shared/check/types.ts';
import { isZone } from '#shared/dates/wall-clock.ts';
import { validateProduct, validateStandard } from '#shared/generated/validators.mjs';
import type { SourceBatch } from '#shared/records/types.ts';
import { byText } from '#shared/records/canonical.ts';
import type { CheckContext, DesignFact, LotFact, LotUse, ProductInForce } from '#shared/rules/types.ts';
import { contextFaults, type ContextFile } from './context-file.ts';
import { isOrderContext, orderContextFaults } from './order-context.ts';

/** The context file cannot be used; the message names every fault. */
export class ContextRefused extends Error {}

const productsOf = (file: ContextFile): readonly ProductInForce[] =>
  file.products?.map((body) => ({ code: body.code, n: 1, effectiveOn: '1900-01-01', body })) ??
  DEMO_CONTEXT.products;

const lotsOf = (file: ContextFile): readonly LotFact[] | null =>
  file.lots?.map(({ product, number, expiresOn = null, history, status }) => ({
    product,
    number,
    expiresOn,
    status: status ?? history?.at(-1)?.status ?? 'in-use',
    ...(history ? { history } : {}),
  })) ?? null;

/** Lots whose receipts are told; unless their use is told too, this one batch is all that uses them. */
const lotUseOf = (file: ContextFile): readonly LotUse[] | null => {
  if (file.lotUse) return file.lotUse;
  const told = file.lots?.filter((lot) => lot.received) ?? [];
  if (told.length === 0) return null;
  return told.map(({ product, number, received = [] }) => {
    const sizes = new Map<number, number>();
    for (const { kitFt3, quantity } of received) sizes.set(kitFt3, (sizes.get(kitFt3) ?? 0) + quantity);
    return {
      product,
      number,
      sizes: [...sizes].map(([kitFt3, kits]) => ({ kitFt3, received: kits, used: 0, own: 0 })),
    };
  });
};

const designOf = (file: ContextFile): readonly DesignFact[] | null =>
  file.design?.map((fact) => ({
    structureNumber: fact.structureNumber,
    kind: fact.kind ?? 'set',
    poleLengthFt: fact.poleLengthFt ?? null,
    poleClass: fact.poleClass ?? null,
    poleMaterial: fact.poleMaterial ?? null,
    embedmentFt: fact.embedmentFt ?? null,
    latitude: fact.latitude ?? null,
    longitude: fact.longitude ?? null,
  })) ?? null;

const faultsOf = (value: unknown): readonly string[] => {
  if (isOrderContext(value)) return orderContextFaults(value);
  const faults = contextFaults(value);
  if (faults.length > 0) return faults;
  const { zone, asOf, products = [], standards = [], area } = value as ContextFile;
  return [
    ...(area && geoAreaOf(area) === null ? ['area: is no GeoJSON polygon'] : []),
    ...(zone === undefined || isZone(zone) ? [] : [`zone: "${zone}" is no IANA time zone`]),
    ...(asOf === undefined || Number.isFinite(Date.parse(asOf)) ? [] : [`asOf: "${asOf}" is no instant`]),
    ...standards.flatMap(({ body }, index) =>
      validateStandard(body).map(({ field, keyword }) => `standards/${index}/${field ?? ''}: ${keyword}`),
    ),
    ...products.flatMap((product, index) =>
      validateProduct(product).map(({ field, keyword }) => `products/${index}/${field ?? ''}: ${keyword}`),
    ),
  ];
};

const contextOf = (file: ContextFile): CheckContext => ({
  ...DEMO_CONTEXT,
  ...contextBeside(file),
  zone: file.zone ?? DEMO_CONTEXT.zone,
  asOfMs: file.asOf === undefined ? null : Date.parse(file.asOf),
  standards:
    file.standards?.toSorted((a, b) => byText(a.effectiveOn, b.effectiveOn)) ?? DEMO_CONTEXT.standards,
  products: productsOf(file),
  lots: lotsOf(file),
  lotUse: lotUseOf(file),
  design: designOf(file),
  area: file.area === null ? 'none' : geoAreaOf(file.area),
});

export type Check = (source: SourceBatch) => CheckResult;

/** On the demo standard, with nothing known beside the workbook. */
export const demoCheck: Check = (source) => checkBatch(source, DEMO_CONTEXT);

/**
 * The check as a context file has it: JSON with zone, asOf, standards, products, lots, design, area; or what the server gives
 * for a work order. Either may carry more: photographs, register, earlier checks … (shared/check/known-beside.ts). Throws ContextRefused.
 */
export const readContext = async (path: string): Promise<Check> => {
  let value: unknown;
  try {
    value = JSON.parse(await readFile(path, 'utf8'));
  } catch (error) {
    const why = error instanceof SyntaxError ? 'is not JSON' : 'cannot be read';
    throw new ContextRefused(`The context file ${path} ${why}: ${(error as Error).message}`);
  }
  const faults = faultsOf(value);
  if (faults.length > 0)
    throw new ContextRefused(`The context file ${path} cannot be used: ${faults.join('; ')}.`);
  if (isOrderContext(value)) return (source) => checkBeforeHandIn(source, value as OrderContextData);
  const context = contextOf(value as ContextFile);
  return (source) => checkBatch(source, context);
};
