/**
 * Times what a key costs in the kit planner: `npm run bench:planner -- [KEYS]` (400).
 * One structure with its drawing's geometry and what-ifs, and a work order of 500 structures: of 20 designs as orders are, and of
 * 500 different ones. Prints the median and the 95th percentile of a recompute; a key has 16 ms.
 */
import { drawSheet } from '#shared/drawing/draw-sheet.ts';
import { depthTable } from '#shared/planner/depth-table.ts';
import { PLAN_DEFAULTS } from '#shared/planner/plan-fields.ts';
import { planOne } from '#shared/planner/plan-one.ts';
import { planOrder, type DesignStructure } from '#shared/planner/plan-order.ts';
import { readPlan } from '#shared/planner/read-plan.ts';
import { rockWhatIfs } from '#shared/planner/rock-what-ifs.ts';
import { mostOpenWaterIn, waterWhatIfs } from '#shared/planner/water-answer.ts';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { machine } from '../machine.ts';

const keys = Number(process.argv[2] ?? 400);
const CONTEXT = { standard: DEMO_STANDARD, product: DEMO_PRODUCT };
const BUDGET_MS = 16;

/** As if somebody typed: another bore with each key, so that nothing is remembered from the last. */
const typed = (key: number) => ({ ...PLAN_DEFAULTS, boreIn: String(16 + (key % 160) / 8), waterIn: '1.2' });

const CLASSES = ['1', '2', '3', '4', '5'];
const LENGTHS = [35, 40, 45, 50];

function structures(designs: number): DesignStructure[] {
  return Array.from({ length: 500 }, (_, at) => {
    const of = at % designs;
    return {
      id: `${at}`,
      structureNumber: `17-${at}`,
      kind: 'set',
      design: {
        poleLengthFt: LENGTHS[of % LENGTHS.length] ?? 40,
        poleClass: CLASSES[Math.floor(of / LENGTHS.length) % CLASSES.length] ?? '4',
        poleMaterial: 'southern-pine',
        ground: 'soil',
        // Designs beyond the twenty of class and length differ in depth.
        embedmentFt: designs > 20 ? 6 + at / 100 : null,
      },
    };
  });
}

function measure(name: string, recompute: (key: number) => unknown, runs: number): void {
  for (let warm = 0; warm < Math.min(runs, 40); warm += 1) recompute(warm);
  const times = Array.from({ length: runs }, (_, key) => {
    const begun = performance.now();
    recompute(key);
    return performance.now() - begun;
  }).sort((a, b) => a - b);
  const at = (share: number) => times[Math.min(times.length - 1, Math.floor(times.length * share))] ?? 0;
  const verdict = at(0.95) < BUDGET_MS ? 'within' : 'over';
  console.log(
    `${name.padEnd(48)} p50 ${at(0.5).toFixed(3)} ms, p95 ${at(0.95).toFixed(3)} ms: ${verdict} ${BUDGET_MS} ms`,
  );
}

console.log(machine());
measure('one structure: plan and kits', (key) => planOne(typed(key), CONTEXT), keys);
measure(
  'one structure: with water, rock and drawing',
  (key) => {
    const plan = planOne(typed(key), CONTEXT);
    waterWhatIfs(plan.values, DEMO_STANDARD);
    mostOpenWaterIn(plan.values, DEMO_STANDARD);
    rockWhatIfs(readPlan(typed(key)), CONTEXT);
    drawSheet({
      record: {
        kind: 'set',
        structureNumber: '17-0417',
        values: plan.values,
        derived: {
          voidFt3: plan.voidFt3?.likely ?? null,
          placedFt3: plan.kits.likely?.placedFt3 ?? null,
          fillRatio: null,
          fillRatioU: null,
          dueFt: plan.dueFt,
          waterWithPoleIn: plan.waterWithPoleIn,
          leastAnnulusIn: plan.leastAnnulusIn,
          poleTaped: plan.poleTaped,
          worstReading: null,
        },
      },
      findings: [],
      purpose: 'plan',
      narrow: false,
      metric: false,
    });
  },
  keys,
);
measure('table: 6 bores by 13 depths', (key) => depthTable(readPlan(typed(key)), CONTEXT), keys);
const tempTyped = (key: number) => ({ ...PLAN_DEFAULTS, tempF: String(50 + (key % 400) / 10) });
// The page plans an order in slices of 6 ms between keys: what counts for a key is the slice, for the answer the whole.
for (const designs of [20, 500]) {
  const order = structures(designs);
  measure(
    `work order of 500 structures, ${designs} designs`,
    (key) => planOrder(order, tempTyped(key), { context: CONTEXT }),
    Math.ceil(keys / 4),
  );
}
