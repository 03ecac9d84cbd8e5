import { normaliseDeg } from '@/lib/geo/angles';
import { add, directionFrom, lengthOf, scale, vectorFrom, vectorToward } from '@/lib/geo/vector';
import { DEG_PER_RAD, RAD_PER_DEG } from '@/lib/units/constants';
import type { Knots, TrueDegrees } from '@/lib/units/quantities';

interface TrackAgainstStream {
  /** Wanted over the ground. */
  readonly trackDeg: TrueDegrees;
  /** Through the water. */
  readonly speedKn: Knots;
  /** Where the stream sets toward. */
  readonly setDeg: TrueDegrees;
  readonly driftKn: Knots;
}

/**
 * Direction to move through the water so that the stream leaves her on her track, and the speed made good on it.
 * Null where no direction holds the track, or none gets forward along it. Leeway is the caller's.
 * Source: the current triangle, The American Practical Navigator (Pub. No. 9), by the sine rule.
 */
export function courseToSteer({
  trackDeg,
  speedKn,
  setDeg,
  driftKn,
}: TrackAgainstStream): { steerDeg: TrueDegrees; madeGoodKn: Knots } | null {
  if (!(speedKn > 0)) return null;
  const setFromTrack = (setDeg - trackDeg) * RAD_PER_DEG;
  const sine = (driftKn * Math.sin(setFromTrack)) / speedKn;
  if (Math.abs(sine) > 1) return null;
  const correction = Math.asin(sine);
  const madeGoodKn = speedKn * Math.cos(correction) + driftKn * Math.cos(setFromTrack);
  if (!(madeGoodKn > 0)) return null;
  return { steerDeg: normaliseDeg(trackDeg - correction * DEG_PER_RAD), madeGoodKn };
}

/**
 * Wind over the water: the wind over the ground less the stream (docs/model.md §3). A stream that runs with the
 * wind takes from it. Where nothing is left the direction stays that of the wind over the ground.
 */
export function windOverWater(
  wind: { readonly fromDeg: TrueDegrees; readonly kn: Knots },
  stream: { readonly towardDeg: TrueDegrees; readonly kn: Knots },
): { fromDeg: TrueDegrees; kn: Knots } {
  const left = add(vectorFrom(wind.fromDeg, wind.kn), scale(vectorToward(stream.towardDeg, stream.kn), -1));
  const kn = lengthOf(left);
  if (kn < 1e-9) return { fromDeg: normaliseDeg(wind.fromDeg), kn: 0 };
  return { fromDeg: normaliseDeg(directionFrom(left)), kn };
}
