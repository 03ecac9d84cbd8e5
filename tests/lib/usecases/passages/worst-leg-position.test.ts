import { describe, expect, it } from 'vitest';
import { worstLegPosition } from '@/lib/usecases/passages/worst-leg-position';

describe('worstLegPosition', () => {
  it('is null without legs', () => {
    expect(worstLegPosition([])).toBeNull();
  });
  it('takes the worst state before the largest load share', () => {
    const legs = [
      { state: 'within', largestLoadShare: 0.6 },
      { state: 'unknown', largestLoadShare: null },
      { state: 'thin', largestLoadShare: 0.9 },
    ] as const;
    expect(worstLegPosition(legs)).toBe(1);
    expect(worstLegPosition([...legs, { state: 'beyond', largestLoadShare: 0.2 }])).toBe(3);
  });
  it('takes the largest load share of several in one state, and the first of equals', () => {
    const legs = [0.7, 0.9, 0.9].map((largestLoadShare) => ({ state: 'thin' as const, largestLoadShare }));
    expect(worstLegPosition(legs)).toBe(1);
  });
});
