import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { polarSpeedKn } from '@/lib/polars/boat-speed';
import type { Polar } from '@/lib/polars/polar';

const polar: Polar = {
  windSpeedsKn: [6, 10, 14],
  windAnglesDeg: [55, 90, 150],
  speedsKn: [
    [3, 4, 3],
    [5, 7, 6],
    [6, 8, 8],
  ],
};

describe('boat speed of a polar', () => {
  it.each([
    [10, 90, 7],
    [12, 90, 7.5],
    [10, 120, 6.5],
    [8, 72.5, 4.75],
    [3, 90, 2],
    [30, 90, 8],
    [10, -90, 7],
  ])('at %d kn and %d° is %d kn', (windKn, angleDeg, speedKn) => {
    expect(polarSpeedKn(polar, windKn, angleDeg)).toBeCloseTo(speedKn, 9);
  });

  it.each([54.999, 150.001, 0, 180])('is zero at %d°, outside the table', (angleDeg) => {
    expect(polarSpeedKn(polar, 10, angleDeg)).toBe(0);
  });

  it('is zero in a calm', () => {
    expect(polarSpeedKn(polar, 0, 90)).toBe(0);
  });

  it('lies between the corners of its cell', () => {
    const speed = fc.double({ min: 0, max: 20, noNaN: true });
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(fc.tuple(speed, speed, speed, speed), share, share, ([a, b, c, d], wind, angle) => {
        const cell: Polar = {
          windSpeedsKn: [8, 12],
          windAnglesDeg: [60, 100],
          speedsKn: [
            [a, b],
            [c, d],
          ],
        };
        const found = polarSpeedKn(cell, 8 + 4 * wind, 60 + 40 * angle);
        expect(found).toBeGreaterThanOrEqual(Math.min(a, b, c, d) - 1e-9);
        expect(found).toBeLessThanOrEqual(Math.max(a, b, c, d) + 1e-9);
      }),
    );
  });
});
