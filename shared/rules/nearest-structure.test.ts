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

  // 0.00001° of latitude are some 3.6 ft, 0.00002° some 7.3 ft: both within the 10 ft that two accuracies swallow.
  const of = (name: string, north: number) => ({
    place: { ...HERE, latitude: HERE.latitude + north },
    accuracyFt: 5,
    of: name,
  });
  const nearestOf = (...others: ReturnType<typeof of>[]) => {
    const here = of('here', 0);
    return nearestStructure([here, ...others], 3)(here, (other) => other !== 'here')?.other;
  };

  it('takes the nearer by distance where accuracies swallow both, in whatever order they come', () => {
    expect(nearestOf(of('near', 0.00001), of('far', 0.00002))).toBe('near');
    expect(nearestOf(of('far', 0.00002), of('near', 0.00001))).toBe('near');
  });

  it('takes the first of two at one place', () => {
    expect(nearestOf(of('first', 0.00001), of('second', 0.00001))).toBe('first');
  });
});
