import { mergeReefCalls, type PlacedCall } from '@/lib/reef-calls/merge-reef-calls';
import { daylightAt } from '@/lib/time/daylight';
import { MS_PER_HOUR, MS_PER_MINUTE } from '@/lib/units/constants';
import type { CheckResult, CheckState } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import type { EpochMs, Knots } from '@/lib/units/quantities';
import type { Stream } from '@/lib/weather/series';
import { streamAt } from '@/lib/weather/stream-at';
import { windAt } from '@/lib/weather/wind-at';
import { directionOf, lengthOf } from '@/lib/geo/vector';
import { placeAt } from './place-at';

export interface StripLeg {
  readonly index: number;
  readonly from: string;
  readonly to: string;
  readonly startMs: EpochMs;
  readonly endMs: EpochMs;
  readonly state: CheckState;
}

export interface StripWind {
  readonly ms: EpochMs;
  readonly fromDeg: number;
  readonly meanKn: Knots;
  readonly gustKn: Knots;
}

export interface Span {
  readonly startMs: EpochMs;
  readonly endMs: EpochMs;
}

/** Everything the strip draws, laid along time. */
export interface StripModel extends Span {
  /** From here on nothing is known, to the end of the strip; null where she arrives. */
  readonly unknownFromMs: EpochMs | null;
  readonly legs: readonly StripLeg[];
  /** Pieces between the gaps where the wind is not known. */
  readonly wind: readonly (readonly StripWind[])[];
  readonly windGaps: readonly Span[];
  readonly topKn: Knots;
  readonly calls: readonly PlacedCall[];
  readonly ends: readonly (Span & { readonly end: 'A' | 'B' })[];
  readonly shunts: readonly { readonly ms: EpochMs; readonly lat: number; readonly lon: number }[];
  readonly dark: readonly Span[];
  /** Null where no stream was entered. */
  readonly stream: readonly { readonly ms: EpochMs; readonly towardDeg: number; readonly kn: Knots }[] | null;
}

/** Samples over the whole strip; enough that a squall of a typed table is not stepped over on screen. */
const MOST_SAMPLES = 240;

/** Where she is not known to arrive, this share of the strip stays for saying so. */
const UNKNOWN_SHARE = 0.12;

export function stripModel(result: CheckResult, plan: PassagePlan, gustFactor: number): StripModel {
  const startMs = Date.parse(plan.departure);
  const legs = result.legs.flatMap((leg, index) => toStripLeg(leg, index));
  const lastKnown = Math.max(startMs, ...legs.map((leg) => leg.endMs));
  const knownEndMs = Math.max(lastKnown, startMs + 15 * MS_PER_MINUTE);
  const unknownFromMs = result.totals.arrival === null ? lastKnown : null;
  const endMs = unknownFromMs === null ? knownEndMs : knownEndMs + (knownEndMs - startMs) * UNKNOWN_SHARE;
  const times = sampleTimes(startMs, endMs);
  const series = { rows: plan.wind.rows.map((row) => ({ ...row, time: Date.parse(row.time) })) };
  const winds = times.map((ms) => ({ ms, at: windAt(series as Parameters<typeof windAt>[0], ms, gustFactor) }));
  const wind = pieces(winds.map(({ ms, at }) => (at.known ? { ms, ...at.wind } : null)));
  const ends = endsOf(result);
  return {
    startMs,
    endMs,
    unknownFromMs,
    legs,
    wind,
    windGaps: gaps(winds.map(({ ms, at }) => ({ ms, isIn: !at.known }))),
    topKn: Math.max(10, ...wind.flat().map((one) => one.gustKn)),
    calls: mergeReefCalls(result.legs),
    ends,
    shunts: shuntsOf(result, ends),
    dark: gaps(times.map((ms) => ({ ms, isIn: isDarkAt(result, plan, ms) }))),
    stream: streamOf(plan, times),
  };
}

function toStripLeg(leg: CheckResult['legs'][number], index: number): StripLeg[] {
  if (leg.start === null) return [];
  const last = leg.track[leg.track.length - 1];
  const end = leg.end ?? last?.[2] ?? leg.start;
  const { from, to, state } = leg;
  return [{ index, from, to, state, startMs: Date.parse(leg.start), endMs: Date.parse(end) }];
}

function sampleTimes(startMs: EpochMs, endMs: EpochMs): number[] {
  const count = Math.min(MOST_SAMPLES, Math.max(2, Math.ceil((endMs - startMs) / (5 * MS_PER_MINUTE))));
  return Array.from({ length: count + 1 }, (_, i) => startMs + ((endMs - startMs) * i) / count);
}

function pieces(samples: readonly (StripWind | null)[]): StripWind[][] {
  const out: StripWind[][] = [];
  let piece: StripWind[] = [];
  for (const sample of [...samples, null]) {
    if (sample) piece.push(sample);
    else if (piece.length > 0) {
      out.push(piece);
      piece = [];
    }
  }
  return out;
}

/** The stretches where samples are in something: the dark, a gap. */
function gaps(samples: readonly { readonly ms: number; readonly isIn: boolean }[]): Span[] {
  const spans: Span[] = [];
  let start: number | null = null;
  samples.forEach(({ ms, isIn }, i) => {
    if (isIn) start ??= ms;
    const isLast = i === samples.length - 1;
    if (start !== null && (!isIn || isLast)) {
      spans.push({ startMs: start, endMs: ms });
      start = null;
    }
  });
  return spans;
}

function isDarkAt(result: CheckResult, plan: PassagePlan, ms: EpochMs): boolean {
  const place = placeAt(result.legs, ms) ?? plan.route[0];
  return place ? daylightAt(place, ms).isDark : false;
}

function endsOf(result: CheckResult): (Span & { end: 'A' | 'B' })[] {
  const spans: { startMs: number; endMs: number; end: 'A' | 'B' }[] = [];
  for (const leg of result.legs) {
    leg.track.forEach(([, , iso, end], i) => {
      const next = leg.track[i + 1];
      if (!next) return;
      const startMs = Date.parse(iso);
      const endMs = Date.parse(next[2]);
      const last = spans[spans.length - 1];
      if (last && last.end === end) last.endMs = endMs;
      else spans.push({ startMs, endMs, end });
    });
  }
  return spans;
}

/** A shunt is where the leading end changes on the track. */
function shuntsOf(result: CheckResult, ends: StripModel['ends']) {
  return ends.slice(1).flatMap(({ startMs }) => {
    const place = placeAt(result.legs, startMs);
    return place ? [{ ms: startMs, lat: place.lat, lon: place.lon }] : [];
  });
}

function streamOf(plan: PassagePlan, times: readonly number[]): StripModel['stream'] {
  if (plan.streamRows.length === 0) return null;
  const rows = plan.streamRows.map((row) => ({ ...row, time: Date.parse(row.time) }));
  const stream = { kind: 'series', rows } as Stream;
  const hourly = times.filter(
    (ms, i) => i === 0 || Math.floor(ms / MS_PER_HOUR) !== Math.floor(times[i - 1]! / MS_PER_HOUR),
  );
  return hourly.flatMap((ms) => {
    const vector = streamAt(stream, ms);
    return vector ? [{ ms, towardDeg: directionOf(vector), kn: lengthOf(vector) }] : [];
  });
}
