import { NO_VECTOR } from '@/lib/geo/vector';
import { apparentWind } from '@/lib/rigging/apparent-wind';
import { loadOf, type Load } from '@/lib/passages/load';
import type { PreparedBoat } from '@/lib/passages/prepared-boat';
import { sailHeading } from '@/lib/passages/sail-heading';
import { windOverWater } from '@/lib/passages/wind-over-water';
import { lengthOf, subtract } from '@/lib/geo/vector';
import type { Reef } from '@/lib/rigging/craft';
import type { Degrees, Knots } from '@/lib/units/quantities';

export interface BenchLoad extends Load {
  readonly apparentKn: Knots;
  readonly boatKn: Knots;
}

/**
 * One reef in a wind without stream, worked as a step of a passage would be. `angleDeg` null is beam-on at rest.
 */
export function benchLoad(prepared: PreparedBoat, reef: Reef, meanKn: Knots, angleDeg: Degrees | null): BenchLoad {
  const { boat } = prepared;
  const ground = { fromDeg: 0, meanKn, gustKn: meanKn * boat.gustFactor };
  const water = windOverWater({ wind: ground, streamKn: NO_VECTOR }, reef, boat);
  const course =
    angleDeg === null ? null : sailHeading(360 - angleDeg, { boat, reef, wind: water, streamKn: NO_VECTOR });
  const load = loadOf(prepared, reef, course, water, ground);
  const atRestCounts = load.atRestShare !== null && load.atRestShare >= load.loadShare - 1e-12;
  const gustKn = lengthOf(water.gustKn);
  const apparentKn =
    !course || atRestCounts
      ? apparentWind(gustKn, 90, 0).speedKn
      : lengthOf(subtract(water.gustKn, course.throughWaterKn));
  return { ...load, apparentKn, boatKn: course?.boatKn ?? 0 };
}
