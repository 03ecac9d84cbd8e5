import { readFileSync } from 'node:fs';
import * as turf from '@turf/turf';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { loadLandIndex } from '@/lib/adapters/land-data';
import { alongRhumb } from '@/lib/geo/along-rhumb';
import type { LandFile } from '@/lib/geo/land-file';
import { isBoxEdge } from '@/lib/geo/land-segments';
import { readLand } from '@/lib/geo/read-land';
import { rhumbInverse } from '@/lib/geo/rhumb';

const { polygons, box } = readLand(JSON.parse(readFileSync('public/tiles-sample/land.json', 'utf8')) as LandFile);
const figures = polygons.map((rings) => turf.polygon(rings.map((ring) => ring.map((place) => [...place]))));
const index = await loadLandIndex();

const place = fc.record({
  lat: fc.double({ min: box.south, max: box.north, noNaN: true }),
  lon: fc.double({ min: box.west, max: box.east, noNaN: true }),
});
/** Nearer than this the two planes (Mercator here, plain degrees in turf) may put a place on different sides. */
const TOO_NEAR_TO_TELL_M = 2;

describe('the sample coastline', () => {
  // Well known places, positions from memory, each more than 300 m from the shore.
  it.each([
    ['Mount Constitution on Orcas Island', 48.678, -122.831, true],
    ['the middle of San Juan Island', 48.55, -123.08, true],
    ['the middle of Lopez Island', 48.48, -122.89, true],
    ['Victoria, inland of the harbour', 48.44, -123.35, true],
    ['Haro Strait', 48.55, -123.22, false],
    ['Rosario Strait', 48.55, -122.755, false],
    ['the Strait of Juan de Fuca', 48.25, -123.4, false],
    ['San Juan Channel', 48.56, -123.005, false],
  ])('%s', (_name, lat, lon, land) => {
    expect(index.covers({ lat, lon })).toBe(true);
    expect(index.isLand({ lat, lon })).toBe(land);
  });

  it('says nothing of places outside the box', () => {
    expect(index.covers({ lat: 47.6, lon: -122.4 })).toBe(false);
    expect(index.covers({ lat: 48.5, lon: -124.1 })).toBe(false);
  });

  it('sees San Juan Island on a line from Haro Strait to San Juan Channel', () => {
    const met = index.crossesLand({ lat: 48.55, lon: -123.22 }, { lat: 48.56, lon: -123.005 });
    expect(met).not.toBeNull();
    expect(met!.lon).toBeGreaterThan(-123.2);
    expect(met!.lon).toBeLessThan(-123.14);
    expect(index.distanceToShoreM(met!)).toBeLessThan(0.01);
  });

  it('lets a line down the middle of the Strait of Juan de Fuca pass', () => {
    expect(index.crossesLand({ lat: 48.23, lon: -123.95 }, { lat: 48.27, lon: -123.0 })).toBeNull();
  });
});

describe('the land index beside plain computation', () => {
  it('agrees with point-in-polygon over all polygons', () => {
    fc.assert(
      fc.property(place, (point) => {
        fc.pre(index.distanceToShoreM(point) > TOO_NEAR_TO_TELL_M);
        const brute = figures.some((figure) => turf.booleanPointInPolygon([point.lon, point.lat], figure));
        expect(index.isLand(point)).toBe(brute);
      }),
      { numRuns: 300 },
    );
  });

  it('finds the same distance as measuring every piece of shore', () => {
    fc.assert(
      fc.property(place, (point) => {
        let nearest = Infinity;
        for (const ring of polygons.flat()) {
          for (let i = 0; i + 1 < ring.length; i++) {
            if (isBoxEdge(ring[i]!, ring[i + 1]!, box)) continue;
            nearest = Math.min(nearest, distanceToPieceM(point, ring[i]!, ring[i + 1]!));
          }
        }
        expect(Math.abs(index.distanceToShoreM(point) - nearest)).toBeLessThan(0.05 + 0.003 * nearest);
      }),
      { numRuns: 25 },
    );
  });

  it('agrees with turf where a line crosses, there and back', () => {
    const shores = figures.map((figure) => turf.polygonToLine(figure));
    fc.assert(
      fc.property(place, place, (a, b) => {
        fc.pre(!index.isLand(a) && !index.isLand(b));
        // Short lines, so that the rhumb line and turf's straight line in degrees are one within a metre.
        const end = alongRhumb(a, b, 0.03);
        const met = index.crossesLand(a, end);
        expect(index.crossesLand(end, a) === null).toBe(met === null);
        const line = turf.lineString([
          [a.lon, a.lat],
          [end.lon, end.lat],
        ]);
        const brute = shores.some((shore) => turf.lineIntersect(line, shore as never).features.length > 0);
        expect(met !== null).toBe(brute);
      }),
      { numRuns: 60 },
    );
  });

  it('is clear of land all the way where no crossing is found, and up to the crossing where one is', () => {
    fc.assert(
      fc.property(place, place, (a, b) => {
        fc.pre(!index.isLand(a));
        const met = index.crossesLand(a, b);
        const end = met ?? b;
        for (let step = 0; step < 200; step++) {
          const point = alongRhumb(a, end, step / 200);
          if (index.distanceToShoreM(point) > TOO_NEAR_TO_TELL_M) expect(index.isLand(point)).toBe(false);
        }
        if (met) expect(index.distanceToShoreM(met)).toBeLessThan(0.01);
      }),
      { numRuns: 60 },
    );
  });

  it('never changes the distance to shore by more than the way between two places', () => {
    fc.assert(
      fc.property(place, fc.double({ min: -0.02, max: 0.02, noNaN: true }), (a, shift) => {
        const b = { lat: a.lat + shift, lon: a.lon - shift };
        const way = rhumbInverse(a, b).distanceM;
        const change = Math.abs(index.distanceToShoreM(a) - index.distanceToShoreM(b));
        expect(change).toBeLessThan(way * 1.004 + 0.003 * index.distanceToShoreM(a) + 0.01);
      }),
      { numRuns: 200 },
    );
  });
});

/** Metres from a place to a piece of shore on the flat, at the scale of the place (mean earth radii of its latitude). */
function distanceToPieceM(
  point: { lat: number; lon: number },
  from: readonly [number, number],
  to: readonly [number, number],
): number {
  const phi = (point.lat * Math.PI) / 180;
  // Metres for a degree, series in even multiples of latitude: American Practical Navigator (Pub. No. 9), table 7.
  const north = 111132.92 - 559.82 * Math.cos(2 * phi) + 1.175 * Math.cos(4 * phi);
  const east = 111412.84 * Math.cos(phi) - 93.5 * Math.cos(3 * phi) + 0.118 * Math.cos(5 * phi);
  const ax = (from[0] - point.lon) * east;
  const ay = (from[1] - point.lat) * north;
  const dx = (to[0] - from[0]) * east;
  const dy = (to[1] - from[1]) * north;
  const lengthSq = dx * dx + dy * dy;
  const along = lengthSq > 0 ? Math.min(1, Math.max(0, -(ax * dx + ay * dy) / lengthSq)) : 0;
  return Math.hypot(ax + along * dx, ay + along * dy);
}
