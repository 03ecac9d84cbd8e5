import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { courseToSteer, windOverWater } from '@/lib/geo/current-triangle';
import { add, vectorToward } from '@/lib/geo/vector';

const direction = fc.double({ min: 0, max: 359.999, noNaN: true });

describe('current triangle', () => {
  it('holds the track: what she steers and the stream add up to it', () => {
    fc.assert(
      fc.property(
        direction,
        direction,
        fc.double({ min: 0.5, max: 12, noNaN: true }),
        fc.double({ min: 0, max: 6, noNaN: true }),
        (trackDeg, setDeg, speedKn, driftKn) => {
          const answer = courseToSteer({ trackDeg, speedKn, setDeg, driftKn });
          if (!answer) {
            expect(driftKn).toBeGreaterThanOrEqual(speedKn * 0.999);
            return;
          }
          const ground = add(vectorToward(answer.steerDeg, speedKn), vectorToward(setDeg, driftKn));
          const wanted = vectorToward(trackDeg, answer.madeGoodKn);
          expect(ground.east).toBeCloseTo(wanted.east, 9);
          expect(ground.north).toBeCloseTo(wanted.north, 9);
        },
      ),
      { numRuns: 500 },
    );
  });

  it('has no answer where the stream beats her straight back', () => {
    expect(courseToSteer({ trackDeg: 0, speedKn: 2, setDeg: 180, driftKn: 3 })).toBeNull();
  });

  it('has no answer without speed', () => {
    expect(courseToSteer({ trackDeg: 0, speedKn: 0, setDeg: 0, driftKn: 1 })).toBeNull();
  });
});

describe('wind over the water', () => {
  it('is stronger when the stream runs against the wind', () => {
    const left = windOverWater({ fromDeg: 0, kn: 14 }, { towardDeg: 0, kn: 4 });
    expect(left.kn).toBeCloseTo(18, 9);
    expect(left.fromDeg % 360).toBeCloseTo(0, 9);
  });

  it('swings aft of a stream that runs across it', () => {
    const left = windOverWater({ fromDeg: 0, kn: 10 }, { towardDeg: 90, kn: 10 });
    expect(left.kn).toBeCloseTo(Math.SQRT2 * 10, 9);
    expect(left.fromDeg).toBeCloseTo(45, 9);
  });

  it('is a calm that keeps its direction when the stream runs along as fast as the wind', () => {
    expect(windOverWater({ fromDeg: 240, kn: 3 }, { towardDeg: 60, kn: 3 })).toEqual({ fromDeg: 240, kn: 0 });
  });
});
