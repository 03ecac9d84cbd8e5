import { describe, expect, it } from 'vitest';
import { leewayDegAt } from '@/lib/polars/leeway';

describe('leeway', () => {
  const rows = [
    { angleDeg: 60, leewayDeg: 8 },
    { angleDeg: 90, leewayDeg: 5 },
    { angleDeg: 120, leewayDeg: 2 },
  ];

  it.each([
    [40, 8],
    [60, 8],
    [75, 6.5],
    [-75, 6.5],
    [90, 5],
    [110, 3],
    [170, 2],
  ])('at %d° is %d°', (angleDeg, leewayDeg) => {
    expect(leewayDegAt(rows, angleDeg)).toBeCloseTo(leewayDeg, 9);
  });

  it('is the same everywhere where one value is given', () => {
    expect(leewayDegAt(6, 55)).toBe(6);
    expect(leewayDegAt(6, 150)).toBe(6);
  });
});
