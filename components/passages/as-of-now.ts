import { worstOf } from '@/lib/passage-check/worst-of';
import { OLD_FORECAST_H } from '@/lib/passages/flags/forecast-flags';
import type { CheckResult, CheckState } from '@/lib/passages/passage';
import type { EpochMs, Hours } from '@/lib/units/quantities';

export interface AsOfNow {
  readonly result: CheckResult;
  readonly forecastAgeH: Hours;
  /** The forecast has grown too old since the check: what it allowed is not known any more. */
  readonly hasAged: boolean;
}

/** A stored state as it may be shown now: an old forecast allows nothing, but what is beyond stays beyond. */
export function stateAsOfNow(state: CheckState, forecastAgeH: Hours): CheckState {
  return forecastAgeH > OLD_FORECAST_H && state !== 'beyond' ? 'unknown' : state;
}

/** A stored check as it may be shown now. docs/model.md §7. */
export function resultAsOfNow(result: CheckResult, issuedAt: string, nowMs: EpochMs): AsOfNow {
  const forecastAgeH = (nowMs - Date.parse(issuedAt)) / 3_600_000;
  const legs = result.legs.map((leg) => ({ ...leg, state: stateAsOfNow(leg.state, forecastAgeH) }));
  const hasAged = result.legs.some((leg, index) => leg.state !== legs[index]!.state);
  return {
    result: hasAged ? { ...result, legs, state: worstOf(legs.map((leg) => leg.state)) } : result,
    forecastAgeH,
    hasAged,
  };
}
