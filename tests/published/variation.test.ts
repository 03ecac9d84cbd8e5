import { describe, expect, it } from 'vitest';
import { toMagnetic, variationDeg } from '@/lib/geo/variation';
import published from './variation.json';

describe('magnetic variation: test values of the World Magnetic Model reports', () => {
  it.each(published.cases)('$id $title at $lat $lon: $source', (row) => {
    const found = variationDeg(row, Date.parse(row.date));
    expect(Math.abs(found - row.variationDeg)).toBeLessThanOrEqual(row.toleranceDeg);
  });
});

it(`${published.compass.id} ${published.compass.title}: ${published.compass.source}`, () => {
  const { trueDeg, variationDeg: variation, compassDeg, deviationDeg } = published.compass;
  expect(toMagnetic(trueDeg, variation)).toBeCloseTo(compassDeg + deviationDeg, 9);
});
