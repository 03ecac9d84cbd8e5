import { expect, it } from 'vitest';
import { beaufortForce } from '@/lib/weather/beaufort';

it.each([
  [0.4, 0],
  [3.4, 1],
  [3.5, 2],
  [33.49, 7],
  [33.5, 8],
  [120, 12],
])('rounds %d kn to whole knots: force %d', (kn, force) => {
  expect(beaufortForce(kn)).toBe(force);
});
