import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { signedDeg } from '@/lib/geo/angles';
import { rhumbDirect, rhumbInverse } from '@/lib/geo/rhumb';

const place = fc.record({
  lat: fc.double({ min: -84, max: 84, noNaN: true }),
  lon: fc.double({ min: -180, max: 180, noNaN: true }),
});

describe('rhumb lines', () => {
  it('come back to where they were measured from', () => {
    fc.assert(
      fc.property(
        place,
        fc.double({ min: 0, max: 359.999, noNaN: true }),
        fc.double({ min: 1, max: 60_000, noNaN: true }),
        (from, courseDeg, distanceM) => {
          const back = rhumbInverse(from, rhumbDirect(from, courseDeg, distanceM));
          expect(Math.abs(back.distanceM - distanceM)).toBeLessThan(0.001);
          const offCourseM = (Math.abs(signedDeg(back.courseDeg - courseDeg)) * Math.PI * distanceM) / 180;
          expect(offCourseM).toBeLessThan(0.001);
        },
      ),
      { numRuns: 500 },
    );
  });

  it('reach the place they were measured to', () => {
    fc.assert(
      fc.property(
        place,
        fc.double({ min: -1, max: 1, noNaN: true }),
        fc.double({ min: -2, max: 2, noNaN: true }),
        (from, north, east) => {
          const to = { lat: from.lat + north, lon: signedDeg(from.lon + east) };
          const { courseDeg, distanceM } = rhumbInverse(from, to);
          const reached = rhumbDirect(from, courseDeg, distanceM);
          expect(Math.abs(reached.lat - to.lat)).toBeLessThan(1e-8);
          expect(Math.abs(signedDeg(reached.lon - to.lon))).toBeLessThan(1e-7);
        },
      ),
      { numRuns: 500 },
    );
  });

  it('has no jump where east and west change to the plain parallel', () => {
    // 1e-5 rad is 0.000573° of latitude: just under and just over it.
    const under = rhumbInverse({ lat: 48.5, lon: -123 }, { lat: 48.500572, lon: -122.9 });
    const over = rhumbInverse({ lat: 48.5, lon: -123 }, { lat: 48.500574, lon: -122.9 });
    expect(Math.abs(under.distanceM - over.distanceM)).toBeLessThan(0.01);
  });

  it('measures nothing from a place to itself', () => {
    expect(rhumbInverse({ lat: 48.5, lon: -123 }, { lat: 48.5, lon: -123 })).toEqual({ courseDeg: 0, distanceM: 0 });
  });

  it('takes the shorter way over the antimeridian', () => {
    const { courseDeg, distanceM } = rhumbInverse({ lat: 0, lon: 179.9 }, { lat: 0, lon: -179.9 });
    expect(courseDeg).toBeCloseTo(90, 9);
    expect(distanceM).toBeCloseTo((0.2 * Math.PI * 6_378_137) / 180, 3);
    expect(rhumbDirect({ lat: 0, lon: 179.9 }, 90, distanceM).lon).toBeCloseTo(-179.9, 9);
  });

  it('refuses to run over a pole', () => {
    expect(() => rhumbDirect({ lat: 89.9, lon: 0 }, 0, 50_000)).toThrow(RangeError);
  });
});
