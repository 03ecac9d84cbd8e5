import type { Leeway, Polar } from '@/lib/polars/polar';
import type { Craft } from '@/lib/rigging/craft';
import type {
  Degrees,
  EpochMs,
  Hours,
  Knots,
  Metres,
  NauticalMiles,
  NewtonMetres,
  Seconds,
  TrueDegrees,
} from '@/lib/units/quantities';
import type { Stream, WindSeries } from '@/lib/weather/series';

export interface ShuntHabit {
  readonly seconds: Seconds;
  /** Drift down the wind over the water while stopped. */
  readonly driftKn: Knots;
}

export interface Boat extends Craft {
  readonly polar: Polar;
  readonly closestAngleDeg?: Degrees;
  readonly deepestAngleDeg?: Degrees;
  readonly leewayDeg: Leeway;
  readonly shunt: ShuntHabit;
}

export interface Waypoint {
  readonly name: string;
  readonly lat: number;
  readonly lon: number;
  /** Room to each side of the leg that ends here. */
  readonly corridorHalfWidthM: Metres;
}

export interface Limits {
  readonly meanKn?: Knots;
  readonly gustKn?: Knots;
  readonly loadShare?: number;
  readonly shuntsPerHour?: number;
  readonly hours?: Hours;
  /** false: no sailing after civil dusk is wanted. */
  readonly afterDark?: boolean;
}

export interface Passage {
  readonly boat: Boat;
  readonly route: readonly Waypoint[];
  readonly wind: WindSeries;
  readonly stream: Stream;
  readonly departure: EpochMs;
  /** When the forecast's age is judged. */
  readonly asOf: EpochMs;
  readonly limits?: Limits;
}

/** Worst first: beyond, unknown, thin, within. */
export type CheckState = 'within' | 'thin' | 'beyond' | 'unknown';
export type LeadingEnd = 'A' | 'B' | 'both';
export type Severity = 'danger' | 'caution' | 'notice';

export interface Flag {
  readonly code: FlagCode;
  readonly severity: Severity;
  /** ISO instant, or null where the flag is of the whole leg or passage. */
  readonly at: string | null;
  readonly lat: number | null;
  readonly lon: number | null;
  readonly numbers: Readonly<Record<string, number>>;
}

export type FlagCode =
  | 'beyond-righting-moment'
  | 'little-margin'
  | 'carry-up-to-exceeded'
  | 'carry-above-holds'
  | 'cannot-be-sailed'
  | 'no-room'
  | 'after-dark'
  | 'forecast-old'
  | 'forecast-age-unknown'
  | 'forecast-over'
  | 'wind-not-known'
  | 'stream-not-known'
  | 'no-stream-given'
  | 'never-reached'
  | 'land-on-track'
  | 'land-not-checked'
  | 'many-shunts'
  | 'deep-near-aback-limit'
  | 'aback-not-known'
  | 'no-curve'
  | 'rule-may-hold-gusts'
  | 'over-mean-limit'
  | 'over-gust-limit'
  | 'over-load-share-limit'
  | 'over-shunts-limit'
  | 'over-hours-limit'
  | 'over-dark-limit'
  | 'too-long-to-follow';

export interface ReefCall {
  readonly reef: string;
  /** When the call is made (lead before the need; after the hold for a shallower one). */
  readonly at: string;
  /** When the wind asks for it. */
  readonly by: string;
  /** Place of the call. */
  readonly lat: number;
  readonly lon: number;
  /** The wind that asks for it. */
  readonly meanKn: Knots;
  readonly gustKn: Knots;
}

export interface LegResult {
  readonly from: string;
  readonly to: string;
  readonly courseDeg: TrueDegrees;
  readonly distanceNmi: NauticalMiles;
  readonly sailedNmi: NauticalMiles | null;
  readonly start: string | null;
  readonly end: string | null;
  readonly mode: 'direct' | 'boards' | null;
  readonly leadingEnd: LeadingEnd | null;
  readonly shunts: number;
  readonly reefCalls: readonly ReefCall[];
  readonly largestLoadShare: number | null;
  readonly largestLoadShareAtRest: number | null;
  readonly heelingMomentNewtonM: NewtonMetres | null;
  readonly rightingMomentNewtonM: NewtonMetres | null;
  readonly heelDeg: Degrees | null;
  readonly state: CheckState;
  readonly flags: readonly Flag[];
  /** [lon, lat, ISO time, leading end on the piece that starts here] */
  readonly track: readonly (readonly [number, number, string, 'A' | 'B'])[];
}

export interface CheckResult {
  readonly engineVersion: string;
  readonly caution: string;
  readonly state: CheckState;
  readonly totals: {
    readonly distanceNmi: NauticalMiles;
    readonly sailedNmi: NauticalMiles;
    readonly hours: Hours | null;
    readonly arrival: string | null;
    readonly shunts: number;
    readonly largestLoadShare: number | null;
  };
  readonly legs: readonly LegResult[];
  /** Flags of the whole passage or boat, with words. */
  readonly warnings: readonly (Flag & { readonly message: string })[];
}
