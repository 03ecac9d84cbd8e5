import type { Vector } from '@/lib/geo/vector';
import type { Passage } from '@/lib/passages/passage';
import type { EpochMs } from '@/lib/units/quantities';
import { streamAt } from '@/lib/weather/stream-at';
import { windAt, type Wind } from '@/lib/weather/wind-at';

/** Wind over the ground and stream at one instant. */
export interface Conditions {
  readonly wind: Wind;
  readonly streamKn: Vector;
}

/** Why the conditions at an instant are not known. */
export type UnknownReason = 'wind-before-first' | 'wind-over' | 'wind-shift' | 'stream';

export type ConditionsAt =
  { readonly known: true; readonly conditions: Conditions } | { readonly known: false; readonly reason: UnknownReason };

const REASONS = { 'before-first': 'wind-before-first', over: 'wind-over', shift: 'wind-shift' } as const;

/** Conditions of a passage at an instant, or the reason why they are not known. Series hold everywhere on the route. */
export function conditionsAt(passage: Passage, time: EpochMs): ConditionsAt {
  const wind = windAt(passage.wind, time, passage.boat.gustFactor);
  if (!wind.known) return { known: false, reason: REASONS[wind.reason] };
  const streamKn = streamAt(passage.stream, time);
  if (!streamKn) return { known: false, reason: 'stream' };
  return { known: true, conditions: { wind: wind.wind, streamKn } };
}

/** Instants at which the conditions bend: steps never straddle one. Ascending. */
export function breakpointsOf(passage: Passage): readonly EpochMs[] {
  const times = passage.wind.rows.map((row) => row.time);
  if (passage.stream.kind === 'series') times.push(...passage.stream.rows.map((row) => row.time));
  return [...new Set(times)].sort((a, b) => a - b);
}
