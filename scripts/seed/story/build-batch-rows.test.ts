import { describe, expect, it } from 'vitest';
import { deriveSet } from '#shared/calc/derive-set.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { BATCHES } from './batches.ts';
import { buildBatchRows } from './build-batch-rows.ts';
import { WORK_ORDERS } from './work-orders.ts';

function derived(
  structureNumber: string,
  deviations: Parameters<typeof buildBatchRows>[0]['lines'][number]['deviations'] = [],
) {
  const rows = buildBatchRows({
    workOrder: '17',
    lines: [{ structureNumber, boredAt: '2026-04-14T08:00', lot: 'LK-2291', deviations }],
  });
  const pours = rows.pours.map((pour) => ({
    kitFt3: pour.kitFt3,
    quantity: pour.quantity,
    wastedQuantity: 0,
    componentATempF: Number(pour['componentATempF']),
    componentBTempF: Number(pour['componentBTempF']),
  }));
  return {
    rows,
    derived: deriveSet({ values: rows.set[0]!, pours, standard: DEMO_STANDARD, product: DEMO_PRODUCT }),
  };
}

describe('the demo story', () => {
  it('plans sixty structures on two work orders, each number once', () => {
    const numbers = WORK_ORDERS.flatMap((order) => order.planned.map((planned) => planned.structureNumber));
    expect(numbers).toHaveLength(60);
    expect(new Set(numbers).size).toBe(60);
  });

  it('covers the void of every sound pole, without waste', () => {
    const sets = WORK_ORDERS[0]!.planned.filter((planned) => planned.kind === 'set');
    const unsound = sets.filter(({ structureNumber }) => {
      const { fillRatio, leastAnnulusIn, waterWithPoleIn } = derived(structureNumber).derived;
      return !(fillRatio! >= 1 && fillRatio! <= 1.5 && leastAnnulusIn! >= 2 && waterWithPoleIn! <= 2);
    });
    expect(unsound).toEqual([]);
  });

  it('goes wrong where the story says so', () => {
    expect(derived('17-0417', ['fill-short']).derived.fillRatio).toBeLessThan(1);
    expect(derived('17-0417', ['fill-excess']).derived.fillRatio).toBeGreaterThan(1.5);
    expect(derived('17-0417', ['water-deep']).derived.waterWithPoleIn).toBeGreaterThan(2);
    const short = derived('17-0417', ['embedment-short']);
    expect(short.rows.set[0]!['embedmentFt']).toBeLessThan(short.derived.dueFt!);
    const views = derived('17-0417', ['photo-missing']).rows.photos.map((photo) => photo['view']);
    expect(views).not.toContain('finish');
    expect(views).toContain('bore-depth');
  });

  it('uses each structure in one batch, and has a batch in every lasting state', () => {
    const used = BATCHES.flatMap((batch) => batch.lines.map((line) => line.structureNumber));
    expect(new Set(used).size).toBe(used.length);
    const states = new Set(BATCHES.map((batch) => batch.state));
    expect(states).toEqual(new Set(['draft', 'checked', 'submitted', 'in-review', 'decided', 'on-record']));
  });

  it('tops up in a second event what was short', () => {
    const { lines } = BATCHES.find((batch) => batch.next)!.next!;
    const rows = buildBatchRows({ workOrder: '17', lines });
    expect(rows.events).toHaveLength(1);
    expect(rows.events[0]).toMatchObject({
      structureNumber: '17-0407',
      event: 2,
      beganAt: '2026-04-17T08:55',
    });
    expect(rows.pours.filter((pour) => pour['event'] === 2)).toHaveLength(1);
  });

  it('builds the same batch again', () => {
    const batch = BATCHES[2]!;
    expect(buildBatchRows(batch)).toEqual(buildBatchRows(batch));
  });
});
