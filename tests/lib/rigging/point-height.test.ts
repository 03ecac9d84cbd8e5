import { expect, it } from 'vitest';
import { pointHeightOverWaterM } from '@/lib/rigging/point-height';

it('is under the water by the rise when upright, and the span over it when knocked flat', () => {
  expect(pointHeightOverWaterM(3, 0, 0.1)).toBeCloseTo(-0.1, 12);
  expect(pointHeightOverWaterM(3, 90, 0.1)).toBeCloseTo(3, 12);
});
