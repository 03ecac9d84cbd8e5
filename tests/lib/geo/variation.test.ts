import { describe, expect, it } from 'vitest';
import { toMagnetic, variationDeg } from '@/lib/geo/variation';

describe('variation', () => {
  it.each([
    [10, 16, 354],
    [350, -12, 2],
    [90, 0, 90],
  ])('turns %d° true with %d° of variation into %d° magnetic', (trueDeg, variation, magnetic) => {
    expect(toMagnetic(trueDeg, variation)).toBeCloseTo(magnetic, 9);
  });

  it('answers with the nearest model outside the years that any model covers', () => {
    const place = { lat: 48.5, lon: -123 };
    const lastDay = variationDeg(place, Date.UTC(2029, 10, 12));
    expect(variationDeg(place, Date.UTC(2040, 0, 1))).toBe(lastDay);
    expect(Number.isFinite(variationDeg(place, Date.UTC(1990, 0, 1)))).toBe(true);
  });

  it('moves little from one model to the next', () => {
    const place = { lat: 48.5, lon: -123 };
    const before = variationDeg(place, Date.UTC(2024, 10, 1));
    const after = variationDeg(place, Date.UTC(2025, 0, 1));
    expect(Math.abs(after - before)).toBeLessThan(0.3);
  });
});
