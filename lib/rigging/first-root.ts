/** Halvings that bring any bracket of degrees or knots under the resolution of a double. */
const HALVINGS = 60;

/**
 * The first place from `from` to `to` where a function that starts under zero reaches zero, or null. Steps of at
 * most `step` find the bracket, bisection the place. A hill between two steps that only just reaches zero is
 * looked at again with finer steps, so that it is not missed.
 */
export function firstReachOfZero(
  valueAt: (x: number) => number,
  from: number,
  to: number,
  step: number,
): number | null {
  const steps = Math.max(1, Math.ceil((to - from) / step));
  const placeOf = (index: number) => (index === steps ? to : from + ((to - from) * index) / steps);
  let beforeLast = -Infinity;
  let last = valueAt(from);
  if (last >= 0) return from;
  for (let index = 1; index <= steps; index += 1) {
    const value = valueAt(placeOf(index));
    const topBetween = last >= beforeLast && last > value && index >= 2 && step > FINEST_STEP;
    if (topBetween) {
      const onTop = firstReachOfZero(valueAt, placeOf(index - 2), placeOf(index), step / 50);
      if (onTop !== null) return onTop;
    }
    if (value >= 0) return bisect(valueAt, placeOf(index - 1), placeOf(index));
    beforeLast = last;
    last = value;
  }
  return null;
}

const FINEST_STEP = 1e-3;

/** The crossing between a place under zero and a place at or over it; the answer is on the far side. */
export function bisect(valueAt: (x: number) => number, under: number, over: number): number {
  let low = under;
  let high = over;
  for (let halving = 0; halving < HALVINGS; halving += 1) {
    const middle = (low + high) / 2;
    if (valueAt(middle) >= 0) high = middle;
    else low = middle;
  }
  return high;
}
