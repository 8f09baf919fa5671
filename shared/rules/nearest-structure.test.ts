import { describe, expect, it } from 'vitest';
import { nearestStructure } from './nearest-structure.ts';

const HERE = { latitude: 41.9, longitude: -94.7 };

describe('nearestStructure', () => {
  it('looks no further than one at the very same place, so that a thousand copies of a place stay quick', () => {
    const points = Array.from({ length: 1_000 }, (_, of) => ({ place: HERE, accuracyFt: 5, of }));
    const find = nearestStructure(points, 3);
    let looked = 0;
    for (const point of points) {
      const near = find(point, (other) => {
        looked += 1;
        return other !== point.of;
      });
      expect(near).toEqual({ other: point.of === 0 ? 1 : 0, apartFt: 0, distanceFt: 0 });
    }
    // One each, and the first also meets itself.
    expect(looked).toBe(1_001);
  });
});
