const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Where a function is largest between two ends, to `tolerance`: golden-section search, and the ends themselves,
 * so that a function with no hill between them is served too. Source: Kiefer (1953); from memory.
 */
export function largestBetween(valueAt: (x: number) => number, from: number, to: number, tolerance = 1e-6): number {
  let low = from;
  let high = to;
  let left = high - GOLDEN * (high - low);
  let right = low + GOLDEN * (high - low);
  let valueLeft = valueAt(left);
  let valueRight = valueAt(right);
  while (high - low > tolerance) {
    if (valueLeft >= valueRight) {
      [high, right, valueRight] = [right, left, valueLeft];
      left = high - GOLDEN * (high - low);
      valueLeft = valueAt(left);
    } else {
      [low, left, valueLeft] = [left, right, valueRight];
      right = low + GOLDEN * (high - low);
      valueRight = valueAt(right);
    }
  }
  const middle = (low + high) / 2;
  return [from, to].reduce((best, end) => (valueAt(end) >= valueAt(best) ? end : best), middle);
}
