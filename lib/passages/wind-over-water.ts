import { directionFrom, lengthOf, subtract, vectorFrom, type Vector } from '@/lib/geo/vector';
import type { Conditions } from '@/lib/passages/conditions';
import type { Craft, Reef } from '@/lib/rigging/craft';
import type { Knots, TrueDegrees } from '@/lib/units/quantities';

/** Mean and gust as the boat meets them on the moving water, at the reef's centre of effort. */
export interface WindOverWater {
  readonly fromDeg: TrueDegrees;
  readonly meanKn: Knots;
  readonly gustKn: Vector;
}

/** Height of a forecast's wind, m. WMO-No. 8, part I, chapter 5. */
const FORECAST_HEIGHT_M = 10;

/**
 * The forecast's wind over the ground, brought to the reef's centre of effort, V(z) = V10·(z/10)^a, less the
 * stream. The gust blows over the ground from the mean's direction and is treated the same way. docs/model.md §3.
 */
export function windOverWater(conditions: Conditions, reef: Reef, craft: Craft): WindOverWater {
  const exponent = craft.windHeightExponent;
  const factor = exponent === 0 ? 1 : (reef.centreHeightM / FORECAST_HEIGHT_M) ** exponent;
  const { wind, streamKn } = conditions;
  const mean = subtract(vectorFrom(wind.fromDeg, wind.meanKn * factor), streamKn);
  return {
    fromDeg: directionFrom(mean),
    meanKn: lengthOf(mean),
    gustKn: subtract(vectorFrom(wind.fromDeg, wind.gustKn * factor), streamKn),
  };
}
