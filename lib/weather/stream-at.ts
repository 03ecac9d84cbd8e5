import { add, NO_VECTOR, scale, vectorToward, type Vector } from '@/lib/geo/vector';
import type { EpochMs } from '@/lib/units/quantities';
import type { Stream } from '@/lib/weather/series';
import { lastRowAtOrBefore } from '@/lib/weather/wind-at';

/**
 * The stream at an instant as a vector in knots, linear on components. Null outside its rows: not known, never
 * zero. Where none was given it is left out of the check, and that is zero. docs/model.md §7.
 */
export function streamAt(stream: Stream, time: EpochMs): Vector | null {
  if (stream.kind === 'none') return NO_VECTOR;
  const { rows } = stream;
  const first = rows[0];
  const last = rows[rows.length - 1];
  if (!first || !last || time < first.time || time > last.time) return null;
  const index = lastRowAtOrBefore(rows, time);
  const before = rows[index]!;
  const after = rows[index + 1];
  const here = vectorToward(before.towardDeg, before.kn);
  if (!after) return here;
  const share = (time - before.time) / (after.time - before.time);
  return add(scale(here, 1 - share), scale(vectorToward(after.towardDeg, after.kn), share));
}
