import type { Decision } from '@/lib/passages/decide';
import type { End, Place } from '@/lib/passages/sailing';
import type { UnknownReason } from '@/lib/passages/conditions';
import type { EpochMs, NauticalMiles } from '@/lib/units/quantities';
import type { Wind } from '@/lib/weather/wind-at';

/** The passage at one instant, as it was checked. */
export interface Sample extends Place {
  readonly time: EpochMs;
  /** Wind over the ground. */
  readonly wind: Wind;
  readonly decision: Decision;
}

export interface Shunt extends Place {
  readonly time: EpochMs;
  readonly to: End;
}

/** A point of the track; `end` leads on the piece that starts here. */
export interface TrackPoint extends Place {
  readonly time: EpochMs;
  readonly end: End;
}

export type StopReason = UnknownReason | 'no-room' | 'never-reached' | 'too-long';

/** One leg as far as it was followed. */
export interface FollowedLeg {
  readonly start: EpochMs;
  readonly samples: readonly Sample[];
  readonly shunts: readonly Shunt[];
  readonly track: readonly TrackPoint[];
  readonly sailedNmi: NauticalMiles;
  readonly inBoards: boolean;
  /** Reached the leg's end at this time; null where it was not followed so far. */
  readonly end: EpochMs | null;
  readonly stop: { readonly reason: StopReason; readonly time: EpochMs; readonly place: Place } | null;
}
