import { add, directionFrom, lengthOf, scale, vectorFrom } from '@/lib/geo/vector';
import type { EpochMs, Knots, TrueDegrees } from '@/lib/units/quantities';
import type { WindRow, WindSeries } from '@/lib/weather/series';

export interface Wind {
  readonly fromDeg: TrueDegrees;
  readonly meanKn: Knots;
  readonly gustKn: Knots;
}

export type WindAt =
  | { readonly known: true; readonly wind: Wind }
  | { readonly known: false; readonly reason: 'before-first' | 'over' | 'shift' };

/** Between rows that differ by more than this, the wind in between is anybody's guess. docs/model.md §7. */
const LARGEST_SHIFT_DEG = 90;

/**
 * The wind over the ground at an instant: direction from interpolated components, mean and gust as speeds; a
 * missing gust is mean × gust factor at the rows. Not known outside the rows, and between rows more than 90° apart.
 */
export function windAt(series: WindSeries, time: EpochMs, gustFactor: number): WindAt {
  const { rows } = series;
  const first = rows[0];
  const last = rows[rows.length - 1];
  if (!first || !last || time < first.time) return { known: false, reason: 'before-first' };
  if (time > last.time) return { known: false, reason: 'over' };
  const index = lastRowAtOrBefore(rows, time);
  const before = rows[index]!;
  const after = rows[index + 1];
  if (!after || time === before.time) return { known: true, wind: windOfRow(before, gustFactor) };
  if (shiftDeg(before, after) > LARGEST_SHIFT_DEG) return { known: false, reason: 'shift' };
  const share = (time - before.time) / (after.time - before.time);
  const components = add(
    scale(vectorFrom(before.fromDeg, before.meanKn), 1 - share),
    scale(vectorFrom(after.fromDeg, after.meanKn), share),
  );
  const mix = (a: number, b: number) => a + (b - a) * share;
  return {
    known: true,
    wind: {
      fromDeg: lengthOf(components) > 1e-9 ? directionFrom(components) : before.fromDeg,
      meanKn: mix(before.meanKn, after.meanKn),
      gustKn: mix(gustOf(before, gustFactor), gustOf(after, gustFactor)),
    },
  };
}

function windOfRow(row: WindRow, gustFactor: number): Wind {
  return { fromDeg: row.fromDeg % 360, meanKn: row.meanKn, gustKn: gustOf(row, gustFactor) };
}

function gustOf(row: WindRow, gustFactor: number): Knots {
  return row.gustKn ?? row.meanKn * gustFactor;
}

/** A calm has no direction, so nothing shifts from or to it. */
function shiftDeg(a: WindRow, b: WindRow): number {
  if (a.meanKn === 0 || b.meanKn === 0) return 0;
  const apart = Math.abs(a.fromDeg - b.fromDeg) % 360;
  return apart > 180 ? 360 - apart : apart;
}

/** Index of the last row not after `time`, by halving; the caller has made sure there is one. */
export function lastRowAtOrBefore(rows: readonly { readonly time: EpochMs }[], time: EpochMs): number {
  let low = 0;
  let high = rows.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (rows[middle]!.time <= time) low = middle;
    else high = middle - 1;
  }
  return low;
}
