import type { LandIndex } from '@/lib/geo/land';
import { CAUTION, ENGINE_VERSION } from '@/lib/passage-check/caution';
import { flagsByLeg } from '@/lib/passage-check/leg-flags';
import { legResult } from '@/lib/passage-check/leg-result';
import { reefCallsByLeg } from '@/lib/passage-check/reef-calls-by-leg';
import { passageWarnings } from '@/lib/passage-check/warnings';
import { worstOf } from '@/lib/passage-check/worst-of';
import { isForecastOld } from '@/lib/passages/flags/forecast-flags';
import { followPassage } from '@/lib/passages/follow-passage';
import type { CheckResult, LegResult, Passage } from '@/lib/passages/passage';
import { MS_PER_HOUR } from '@/lib/units/constants';

/**
 * The check: sails the passage on paper and says, leg by leg, how she goes, which end leads, which reef is called by
 * when, and how heeling moment stands to righting moment. Pure: the same in a browser, on the server and in tests.
 *
 * @param passage valid input (lib/schemas); impossible input has been refused before
 * @param options.land coastline to hold the track against; without it each leg says that land was not checked
 */
export function checkPassage(passage: Passage, options: { readonly land?: LandIndex | undefined } = {}): CheckResult {
  const followed = followPassage(passage);
  const flags = flagsByLeg(passage, followed, options.land);
  const calls = reefCallsByLeg(followed);
  const forecastOld = isForecastOld(passage);
  const legs = followed.legs.map((leg, index) =>
    legResult(leg, { flags: flags[index]!, reefCalls: calls[index]!, forecastOld }),
  );
  const arrival = legs.every((leg) => leg.end !== null) ? (legs[legs.length - 1]?.end ?? null) : null;
  const hours = arrival === null ? null : (Date.parse(arrival) - passage.departure) / MS_PER_HOUR;
  return {
    engineVersion: ENGINE_VERSION,
    caution: CAUTION,
    state: worstOf(legs.map((leg) => leg.state)),
    totals: {
      distanceNmi: sum(legs, (leg) => leg.distanceNmi),
      sailedNmi: sum(legs, (leg) => leg.sailedNmi ?? 0),
      hours,
      arrival,
      shunts: sum(legs, (leg) => leg.shunts),
      largestLoadShare: largestShare(legs),
    },
    legs,
    warnings: passageWarnings(passage, followed, hours),
  };
}

function sum(legs: readonly LegResult[], measure: (leg: LegResult) => number): number {
  return legs.reduce((total, leg) => total + measure(leg), 0);
}

function largestShare(legs: readonly LegResult[]): number | null {
  const shares = legs.flatMap((leg) => leg.largestLoadShare ?? []);
  return shares.length === 0 ? null : Math.max(...shares);
}
