import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DEMO_PRODUCT, DEMO_STANDARD } from '#shared/standard/demo.ts';
import { PLAN_DEFAULTS, PLAN_FIELDS } from './plan-fields.ts';
import { planOne } from './plan-one.ts';

const CONTEXT = { standard: DEMO_STANDARD, product: DEMO_PRODUCT };
/** 40 ft class 4 southern pine in a 20 in bore in soil. */
const POLE = { ...PLAN_DEFAULTS, boreIn: '20' };
const faultsOf = (texts: Record<string, string>) =>
  Object.fromEntries(planOne(texts, CONTEXT).faults.map(({ field, text }) => [field, text]));

describe('a pole to be set', () => {
  it('has depth, void and kits', () => {
    // Void 9.1185 ft³: worked records WR-02 and published example PG-ANN-01 (hole less pole by exact arithmetic).
    // Kits: WK2, need 10.0304, 8 + 2.5, surplus 0.4696.
    const plan = planOne(POLE, CONTEXT);
    expect(plan.dueFt).toBe(6);
    expect(plan.voidFt3?.likely).toBeCloseTo(9.1185, 4);
    expect(plan.kits.likely?.needFt3).toBeCloseTo(10.0304, 3);
    expect(plan.kits.likely?.kits).toEqual([8, 2.5]);
    expect(plan.kits.likely?.surplusFt3).toBeCloseTo(0.4696, 3);
    expect(plan.leastAnnulusIn).toBeCloseTo(4.317, 3);
    expect(plan.faults).toEqual([]);
  });

  it('has a void from low to high over its tolerances', () => {
    // By hand, a cylinder: 12 in pole taped, 18 in bore, 6 ft: π/4·(D² − d²)/144·h.
    // Low: 17.5 in bore, 12.2 in pole, 5 ft 11 in: 5.0797; high: 18.5, 11.8, 6 ft 1 in: 6.7358. Likely 5.8905 (WR-08).
    const plan = planOne(
      {
        ...PLAN_DEFAULTS,
        boreIn: '18',
        diameterGroundLineIn: '12',
        diameterButtIn: '12',
        tolBoreIn: '0.5',
        tolPoleIn: '0.2',
        tolDepthIn: '1',
      },
      CONTEXT,
    );
    expect(plan.voidFt3?.likely).toBeCloseTo(5.8905, 4);
    expect(plan.voidFt3?.low).toBeCloseTo(5.0797, 4);
    expect(plan.voidFt3?.high).toBeCloseTo(6.7358, 4);
  });

  it('takes a pole by the class table as no thinner than the table has it', () => {
    // By hand: 1 in thicker, 11.6634 to 12.3655 in, 4.7251 ft³ of pole in 13.0900 ft³ of bore. Not thinner: high is the likely 9.1185.
    const plan = planOne({ ...POLE, tolBoreIn: '0', tolDepthIn: '0', tolPoleIn: '1' }, CONTEXT);
    expect(plan.voidFt3?.low).toBeCloseTo(8.3649, 4);
    expect(plan.voidFt3?.high).toBeCloseTo(9.1185, 4);
  });

  it('takes the least auger that leaves the standard’s 2 in all round', () => {
    // Butt 35.7059/π = 11.3655 in: 16 in leaves 2.317 in, 15 in 1.817 in.
    expect(planOne(PLAN_DEFAULTS, CONTEXT).boreIn).toBe(16);
    expect(planOne({ ...PLAN_DEFAULTS, augersIn: '12, 15, 15.5, 20' }, CONTEXT).boreIn).toBe(15.5);
    const none = planOne({ ...PLAN_DEFAULTS, augersIn: '12, 14' }, CONTEXT);
    expect(none.boreIn).toBe(14);
    expect(none.notes[0]?.text).toBe(
      'No auger of the list leaves 2 in all round this pole; the widest is drawn.',
    );
  });

  it('stands deeper by design, over-dig and bed', () => {
    const deeper = planOne({ ...POLE, designFt: '7' }, CONTEXT);
    expect([deeper.dueFt, deeper.depthFt]).toEqual([7, 7]);
    // WR-06: 6 in of over-dig without a bed, taped girths: 9.7609. WR-07: with a stone bed 8.6701.
    const taped = { ...POLE, girthGroundLineIn: '35', girthButtIn: '38', overDigFt: '6 in' };
    expect(planOne({ ...taped, overDigFt: '0.5' }, CONTEXT).voidFt3?.likely).toBeCloseTo(9.7609, 4);
    expect(
      planOne({ ...taped, overDigFt: '0.5', bedMaterial: 'crushed-stone' }, CONTEXT).voidFt3?.likely,
    ).toBeCloseTo(8.6701, 4);
  });

  it('tells of cold foam and allows for it', () => {
    // WK4: 20 ft³ at 50 °F, factor 0.9: need 24.4444, 8 + 8 + 6 + 2.5. Here the 9.1185 of WR-02: 10.0304/0.9 = 11.1448.
    const cold = planOne({ ...POLE, tempF: '50' }, CONTEXT);
    expect(cold.kits.likely?.needFt3).toBeCloseTo(11.1448, 3);
    expect(cold.notes.some(({ tone, text }) => tone === 'query' && text.includes('50 °F'))).toBe(true);
    expect(planOne({ ...POLE, tempF: '35' }, CONTEXT).notes.at(-1)?.text).toBe(
      'EP-15 must not be mixed at 35 °F: its components are to be from 40 °F to 100 °F.',
    );
  });

  it('says beside each field what is wrong, and computes the rest', () => {
    expect(faultsOf({ ...POLE, boreIn: '0' })).toEqual({
      boreIn: '“0” must be above zero: from 4 to 144 in.',
    });
    expect(faultsOf({ ...POLE, boreIn: '11' })).toEqual({
      boreIn: 'The pole is wider than the bore: 11.4 in in 11 in.',
    });
    expect(faultsOf({ ...POLE, poleLengthFt: '4O' })).toEqual({
      poleLengthFt: '“4O” is no number. Write it such as 6.5 or 6 ft 6 in.',
    });
    expect(faultsOf({ ...POLE, poleLengthFt: '37' })).toEqual({
      poleClass:
        'The class table has no southern pine of 37 ft, class 4: tape it at ground line and at the butt.',
    });
    expect(faultsOf({ ...POLE, poleMaterial: 'elm' })).toEqual({
      poleMaterial: '“elm” is not known here. Choose one of the list.',
    });
    expect(faultsOf({ ...POLE, ground: 'soil-over-rock' })).toEqual({
      rockFromFt: 'Give the depth at which rock begins.',
    });
    expect(faultsOf({ ...PLAN_DEFAULTS, augersIn: '' })).toEqual({
      augersIn: 'List the augers on the truck, or give the bore.',
    });
    expect(faultsOf({ ...POLE, taperIn: '20' })).toEqual({
      taperIn: 'A bore of 20 in cannot narrow by 20 in.',
    });
    expect(faultsOf({ ...POLE, waterIn: '80' })).toEqual({ waterIn: 'Deeper than the bore.' });
    expect(faultsOf({ ...POLE, embedmentFt: '40' })).toMatchObject({
      embedmentFt: 'Deeper than the pole is long.',
    });
    expect(faultsOf({ ...POLE, boreIn: '18 ft' })['boreIn']).toBe(
      '“18 ft” is in feet; this field is in inches.',
    );
    // The depth due is still known where the pole is not.
    expect(planOne({ ...POLE, poleClass: '' }, CONTEXT).dueFt).toBe(6);
  });

  it('has no kits without a product, and no need that no set of kits meets', () => {
    expect(planOne(POLE, { ...CONTEXT, product: null }).kits.likely).toBeNull();
    expect(planOne({ ...POLE, kitsFt3: '40' }, CONTEXT).kits.likely?.kits).toEqual([40]);
  });

  it('is total: whatever is typed, it answers without throwing, and no figure is NaN', () => {
    const texts = fc.dictionary(
      fc.constantFrom(...PLAN_FIELDS.map(({ key }) => key)),
      fc.oneof(
        fc.string({ maxLength: 8 }),
        fc.double({ min: -50, max: 200 }).map(String),
        fc.integer({ min: 0, max: 60 }).map(String),
        fc.constantFrom(
          'set',
          'straighten',
          'relevel',
          'steel',
          'open',
          'square',
          'soil-over-rock',
          '18, 20',
        ),
      ),
    );
    fc.assert(
      fc.property(texts, (typed) => {
        const { voidFt3, kits, dueFt } = planOne({ ...PLAN_DEFAULTS, ...typed }, CONTEXT);
        const figures = [dueFt, voidFt3?.low, voidFt3?.likely, voidFt3?.high, kits.likely?.needFt3];
        expect(figures.filter((figure) => Number.isNaN(figure) || figure === Infinity)).toEqual([]);
        const { low, likely, high } = voidFt3 ?? { low: 0, likely: 0, high: 0 };
        expect(0 <= low && low <= likely && likely <= high).toBe(true);
      }),
    );
  });
});
