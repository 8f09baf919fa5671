import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeLabels } from './place-labels.ts';

const room = { top: 0, bottom: 300, gap: 10 };

describe('placeLabels', () => {
  it('leaves labels that do not collide level with what they name', () => {
    const { placed, left } = placeLabels(
      [
        { id: 'a', wantY: 50, height: 20 },
        { id: 'b', wantY: 200, height: 40 },
      ],
      room,
    );
    expect(placed).toEqual([
      { id: 'a', y: 40 },
      { id: 'b', y: 180 },
    ]);
    expect(left).toEqual([]);
  });

  it('shares the distance between two that want one place', () => {
    const { placed } = placeLabels(
      [
        { id: 'a', wantY: 100, height: 20 },
        { id: 'b', wantY: 100, height: 20 },
      ],
      room,
    );
    // Tops 30 apart (height and gap), the middle of both at the wished 100: by hand.
    expect(placed).toEqual([
      { id: 'a', y: 75 },
      { id: 'b', y: 105 },
    ]);
  });

  it('leaves out what is optional first when there is no room', () => {
    const { placed, left } = placeLabels(
      [
        { id: 'fact', wantY: 10, height: 200, optional: true },
        { id: 'finding 1', wantY: 20, height: 150 },
        { id: 'finding 2', wantY: 30, height: 140 },
      ],
      room,
    );
    expect(left).toEqual(['fact']);
    expect(placed.map((label) => label.id)).toEqual(['finding 1', 'finding 2']);
  });

  it('never overlaps, keeps the order of the wishes and stays inside, for any labels', () => {
    const label = fc.record({
      wantY: fc.integer({ min: -100, max: 500 }),
      height: fc.integer({ min: 10, max: 70 }),
      optional: fc.boolean(),
    });
    fc.assert(
      fc.property(fc.array(label, { maxLength: 14 }), (wishes) => {
        const labels = wishes.map((wish, index) => ({ ...wish, id: String(index) }));
        const { placed, left } = placeLabels(labels, room);
        expect(placed.length + left.length).toBe(labels.length);
        let end = room.top - 1e-6;
        let wished = Number.NEGATIVE_INFINITY;
        for (const { id, y } of placed) {
          const own = labels[Number(id)];
          expect(y).toBeGreaterThanOrEqual(end);
          expect(own?.wantY).toBeGreaterThanOrEqual(wished);
          end = y + (own?.height ?? 0) - 1e-6;
          wished = own?.wantY ?? 0;
        }
        expect(end).toBeLessThanOrEqual(room.bottom);
      }),
    );
  });
});
