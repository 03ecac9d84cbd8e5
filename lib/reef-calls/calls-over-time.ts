import type { EpochMs } from '@/lib/units/quantities';
import { MS_PER_MINUTE } from '@/lib/units/constants';

/** From its start until the next one's, the wind asks for this reef. Higher index, less sail. Ascending in time. */
export interface ReefNeed {
  readonly from: EpochMs;
  readonly reefIndex: number;
}

export interface TimedCall {
  readonly reefIndex: number;
  /** When it is called. */
  readonly at: EpochMs;
  /** When the wind asks for it; for less sail taken off again, the same as `at`. */
  readonly by: EpochMs;
}

export interface CallTiming {
  readonly leadMs: number;
  readonly holdMs: number;
}

/** Defaults, seamanship judgement without a source. docs/model.md §4. */
export const DEFAULT_TIMING: CallTiming = { leadMs: 15 * MS_PER_MINUTE, holdMs: 30 * MS_PER_MINUTE };

/** Two calls for less sail within this time are one call, straight to the deeper reef: nobody reefs twice in it. */
const ONE_CALL_WITHIN_MS = 5 * MS_PER_MINUTE;

/**
 * Calls over time from what each instant asks for. A deeper reef is called the lead time before it is needed, a
 * shallower one only after the lull has held: at any time the deepest reef asked for from `hold` ago to `lead`
 * ahead is carried, so calls do not flap. The first call is at the start. Calls move in time only.
 */
export function callsOverTime(
  needs: readonly ReefNeed[],
  end: EpochMs,
  timing: CallTiming = DEFAULT_TIMING,
): readonly TimedCall[] {
  const first = needs[0];
  if (!first) return [];
  const spans = needs.map((need, index) => ({ ...need, to: needs[index + 1]?.from ?? end }));
  const carriedAt = (time: EpochMs) =>
    Math.max(
      ...spans
        .filter((span) => span.from <= time + timing.leadMs && span.to > time - timing.holdMs)
        .map((span) => span.reefIndex),
    );
  const changes = spans
    .flatMap((span) => [span.from - timing.leadMs, span.to + timing.holdMs])
    .filter((time) => time > first.from && time < end)
    .sort((a, b) => a - b);
  const calls: TimedCall[] = [];
  for (const at of [first.from, ...changes]) {
    const reefIndex = carriedAt(at);
    const before = calls[calls.length - 1];
    if (before?.reefIndex === reefIndex) continue;
    const deeper = !before || reefIndex > before.reefIndex;
    if (before && deeper && calls.length > 1 && at - before.at < ONE_CALL_WITHIN_MS && before.by > before.at) {
      calls[calls.length - 1] = { ...before, reefIndex };
      continue;
    }
    const asking = spans.find((span) => span.reefIndex === reefIndex && span.to > at);
    calls.push({ reefIndex, at, by: deeper ? Math.max(at, asking?.from ?? at) : at });
  }
  return calls;
}
