import type { FollowedPassage, PassageLeg } from '@/lib/passages/follow-passage';
import type { ReefCall } from '@/lib/passages/passage';
import type { Reef } from '@/lib/rigging/craft';
import type { Sample } from '@/lib/passages/sample';
import { callsOverTime, type ReefNeed, type TimedCall } from '@/lib/reef-calls/calls-over-time';
import type { EpochMs } from '@/lib/units/quantities';

/**
 * The calls of the whole passage, each with the leg whose wind asks for it (it may be made before that leg begins).
 * A leg without a call of its own names the reef carried into it, so that every leg reached says what is carried.
 */
export function reefCallsByLeg({ prepared, legs }: FollowedPassage): readonly (readonly ReefCall[])[] {
  const samples = legs.flatMap((leg) => leg.followed?.samples ?? []);
  const last = samples[samples.length - 1];
  if (!last) return legs.map(() => []);
  const calls = callsOverTime(needsOf(samples), Math.max(last.time, endOf(legs)));
  const { reefs } = prepared.boat;
  return legs.map((leg, index) => {
    const { followed } = leg;
    if (!followed || followed.samples.length === 0) return [];
    // What is asked for at the waypoint itself belongs to the leg that starts there; at the last one nothing starts.
    const goesOn = (legs[index + 1]?.followed?.samples.length ?? 0) > 0;
    const until = goesOn ? (followed.end ?? Number.POSITIVE_INFINITY) : Number.POSITIVE_INFINITY;
    const own = calls.filter((call) => call.by >= followed.start && call.by < until);
    const listed = own.length > 0 ? own : [carriedInto(calls, followed.start)];
    return listed.map((call) => describeCall(call, samples, reefs));
  });
}

function needsOf(samples: readonly Sample[]): readonly ReefNeed[] {
  return samples
    .map((sample) => ({ from: sample.time, reefIndex: sample.decision.reefIndex }))
    .filter((need, index, all) => index === 0 || all[index - 1]!.reefIndex !== need.reefIndex);
}

function endOf(legs: readonly PassageLeg[]): EpochMs {
  return Math.max(...legs.map(({ followed }) => followed?.end ?? followed?.stop?.time ?? Number.NEGATIVE_INFINITY));
}

function carriedInto(calls: readonly TimedCall[], start: EpochMs): TimedCall {
  const carried = calls.filter((call) => call.at <= start).pop() ?? calls[0]!;
  return { reefIndex: carried.reefIndex, at: start, by: start };
}

function describeCall(call: TimedCall, samples: readonly Sample[], reefs: readonly Reef[]): ReefCall {
  const place = placeAt(samples, call.at);
  const asking = samples.find((sample) => sample.time >= call.by) ?? samples[samples.length - 1]!;
  return {
    reef: reefs[call.reefIndex]!.name,
    at: new Date(call.at).toISOString(),
    by: new Date(call.by).toISOString(),
    lat: place.lat,
    lon: place.lon,
    meanKn: asking.wind.meanKn,
    gustKn: asking.wind.gustKn,
  };
}

/** Between the samples before and after, along the straight piece between them. */
function placeAt(samples: readonly Sample[], time: EpochMs): { readonly lat: number; readonly lon: number } {
  const after = samples.findIndex((sample) => sample.time >= time);
  if (after <= 0) return after === 0 ? samples[0]! : samples[samples.length - 1]!;
  const a = samples[after - 1]!;
  const b = samples[after]!;
  const share = b.time === a.time ? 1 : (time - a.time) / (b.time - a.time);
  return { lat: a.lat + (b.lat - a.lat) * share, lon: a.lon + (b.lon - a.lon) * share };
}
