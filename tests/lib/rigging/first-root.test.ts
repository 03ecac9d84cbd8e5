import { describe, expect, it } from 'vitest';
import { firstReachOfZero } from '@/lib/rigging/first-root';

describe('first reach of zero', () => {
  it('finds the first of several', () => {
    expect(firstReachOfZero((x) => Math.sin(x), Math.PI * 1.1, 20, 0.25)).toBeCloseTo(2 * Math.PI, 9);
  });

  it('answers at once where it starts there', () => {
    expect(firstReachOfZero((x) => x, 0, 10, 0.5)).toBe(0);
  });

  it('says that there is none', () => {
    expect(firstReachOfZero(() => -1, 0, 10, 0.5)).toBeNull();
  });

  it('looks again at a hill between two steps', () => {
    const hill = (x: number) => 0.0001 - (x - 5.1) ** 2;
    expect(firstReachOfZero(hill, 0, 10, 0.5)).toBeCloseTo(5.09, 9);
  });
});
