import geographicLib from 'geographiclib-geodesic';
import fc from 'fast-check';
import { describe, expect, it, test } from 'vitest';
import { geodesicDistanceM } from '#shared/calc/geodesic-distance.ts';

const distance = (lat1: number, lon1: number, lat2: number, lon2: number) =>
  geodesicDistanceM({ latitude: lat1, longitude: lon1 }, { latitude: lat2, longitude: lon2 });

// Source: GeodTest, test set for geodesics on WGS84 (C. F. F. Karney, 2010), rows as used in the GeographicLib test suite
// 2.1. Status: read. Rows 1, 2, 4, 5, 6, 8, 9, 11, 12, 13, 15, 16, 18, 19 of 20.
test.each([
  ['GE-GT-01', 35.60777, -139.44815, -11.17491, -69.95921, 8935244.56048183],
  ['GE-GT-02', 55.52454, 106.05087, 77.03196, 197.18234, 4105086.171392441],
  ['GE-GT-04', -66.99028, 112.2363, -12.70631, 285.90344, 11150344.231208025],
  ['GE-GT-05', -17.42761, 173.34268, -15.84784, 5.93557, 16076603.163118068],
  ['GE-GT-06', 32.84994, 48.28919, -56.28556, 202.29132, 16727068.943816446],
  ['GE-GT-08', -50.56724, -16.30485, -33.56571, -94.97412, 6455670.511866869],
  ['GE-GT-09', -58.93002, -8.90775, -8.91104, 133.13503, 11756066.021986462],
  ['GE-GT-11', -10.62672, -32.0898, 5.883, -134.31681, 11470869.386456301],
  ['GE-GT-12', -21.76221, 166.90563, 48.72884, 213.97627, 9098627.398655491],
  ['GE-GT-13', -19.79938, -174.47484, -11.99349, -154.35109, 2319004.860116939],
  ['GE-GT-15', -87.85331, 85.66836, 66.48646, 16.09921, 17286615.314714465],
  ['GE-GT-16', 1.74708, 128.32011, -11.16617, 11.87109, 12942901.124134742],
  ['GE-GT-18', -41.22777, 122.32875, -7.57291, 130.37946, 3812686.035106021],
  ['GE-GT-19', 11.01307, 138.25278, 6.62726, 247.05981, 11911190.819018409],
])('%s: within a millimetre', (_id, lat1, lon1, lat2, lon2, metres) => {
  const d = distance(lat1, lon1, lat2, lon2);
  expect(Math.abs((d ?? Infinity) - metres)).toBeLessThan(1e-3);
});

// Source: GeographicLib test suite 2.1, GeodSolve0, 4 and 33; tolerance as the suite prints them. Status: read.
test.each([
  ['GE-GS-00', 40.6, -73.8, 49.01666667, 2.55, 5853226, 0.5],
  ['GE-GS-04', 36.493349428792, 0, 36.49334942879201, 0.0000008, 0.072, 0.0005],
])('%s', (_id, lat1, lon1, lat2, lon2, metres, tolerance) => {
  expect(Math.abs((distance(lat1, lon1, lat2, lon2) ?? Infinity) - metres)).toBeLessThan(tolerance);
});

// Opposite places on the equator: the iteration does not settle there, and that is said. No pole is so far from its design.
test.each([
  ['GE-GS-33c', 0, 0, 0, 180],
  ['GE-GS-33d', 0, 0, 0.5, 179.7],
])('%s: no answer rather than a wrong one', (_id, lat1, lon1, lat2, lon2) => {
  expect(distance(lat1, lon1, lat2, lon2)).toBeNull();
});

// Source: one degree of the WGS 84 equator is π·6378137/180 m; short distances by high-precision Vincenty inverse, agreeing with
// a general geodesic library within 0.2 µm. Status: derived by exact arithmetic.
test.each([
  ['GE-EQ1', 0, 10, 0, 11, 111319.49079327],
  ['GE-SH-01', 40, -105, 40.0005, -105, 55.517319],
  ['GE-SH-02', 40, -105, 40, -104.9995, 42.696928],
  ['GE-SH-04', 41.8781, -87.6298, 41.879, -87.6285, 147.096754],
  ['GE-SH-05', 64.8, -147.7, 64.8003, -147.6991, 54.299059],
  ['across the antimeridian as beside it', 0, 179.5, 0, -179.5, 111319.49079327],
  ['one place', 41.25, -97.5, 41.25, -97.5, 0],
])('%s: within a hundredth of a millimetre', (_id, lat1, lon1, lat2, lon2, metres) => {
  expect(Math.abs((distance(lat1, lon1, lat2, lon2) ?? Infinity) - metres)).toBeLessThan(1e-5);
});

test('what is no place has no distance', () => {
  expect(distance(91, 0, 0, 0)).toBeNull();
  expect(distance(Number.NaN, 0, 0, 0)).toBeNull();
});

describe('against GeographicLib (Karney 2013)', () => {
  const degrees = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  const library = (lat1: number, lon1: number, lat2: number, lon2: number) =>
    geographicLib.Geodesic.WGS84.Inverse(lat1, lon1, lat2, lon2).s12 ?? Number.NaN;

  it('agrees within a millimetre wherever it answers up to 15,000 km', () => {
    fc.assert(
      fc.property(degrees(-90, 90), degrees(-180, 180), degrees(-90, 90), degrees(-180, 180), (...at) => {
        const metres = library(...at);
        fc.pre(metres < 15_000_000);
        expect(Math.abs((distance(...at) ?? Infinity) - metres)).toBeLessThan(1e-3);
      }),
      { numRuns: 500 },
    );
  });

  it('agrees within a hundredth of a millimetre over a span of line', () => {
    const near = degrees(-0.01, 0.01);
    fc.assert(
      fc.property(degrees(-85, 85), degrees(-180, 180), near, near, (lat, lon, north, east) => {
        const at = [lat, lon, lat + north, lon + east] as const;
        expect(Math.abs((distance(...at) ?? Infinity) - library(...at))).toBeLessThan(1e-5);
      }),
      { numRuns: 500 },
    );
  });
});
