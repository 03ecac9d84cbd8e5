import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { normaliseDeg, signedDeg } from '@/lib/geo/angles';

const anyTurn = fc.double({ min: -1e5, max: 1e5, noNaN: true });

describe('angles', () => {
  it.each([
    [0, 0],
    [360, 0],
    [-1, 359],
    [725, 5],
    [-0, 0],
    [-1e-20, 0],
  ])('normalises %d to %d', (deg, expected) => {
    expect(normaliseDeg(deg)).toBe(expected);
  });

  it.each([
    [180, 180],
    [-180, 180],
    [190, -170],
    [-190, 170],
    [359, -1],
    [0, 0],
  ])('signs %d as %d', (deg, expected) => {
    expect(signedDeg(deg)).toBe(expected);
  });

  it('keeps its ranges and its direction', () => {
    fc.assert(
      fc.property(anyTurn, (deg) => {
        const whole = normaliseDeg(deg);
        const signed = signedDeg(deg);
        expect(whole >= 0 && whole < 360).toBe(true);
        expect(signed > -180 && signed <= 180).toBe(true);
        expect(Math.cos((whole * Math.PI) / 180)).toBeCloseTo(Math.cos((deg * Math.PI) / 180), 8);
        expect(Math.sin((signed * Math.PI) / 180)).toBeCloseTo(Math.sin((deg * Math.PI) / 180), 8);
      }),
    );
  });
});
