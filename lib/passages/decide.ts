import type { Conditions } from '@/lib/passages/conditions';
import { loadOf, type Load } from '@/lib/passages/load';
import type { PreparedBoat } from '@/lib/passages/prepared-boat';
import type { SailingConditions } from '@/lib/passages/sail-heading';
import { sailingToward, type End, type Place, type Sailing } from '@/lib/passages/sailing';
import { windOverWater } from '@/lib/passages/wind-over-water';

/** The instant's own reef and how she goes on with it. */
export interface Decision {
  readonly reefIndex: number;
  readonly sailing: Sailing;
  readonly load: Load;
  readonly with: SailingConditions;
}

/**
 * The reef call of an instant: the first reef, from full sail down, that serves, each tested at its own boat speed
 * and on the course it would sail; if none does, the least sail. docs/model.md §4.
 */
export function decide(
  prepared: PreparedBoat,
  conditions: Conditions,
  place: Place,
  target: Place,
  present: End | null,
): Decision {
  const { boat } = prepared;
  let last: Decision | null = null;
  for (let reefIndex = 0; reefIndex < boat.reefs.length; reefIndex += 1) {
    last = decisionWith(prepared, conditions, place, target, present, reefIndex);
    if (last.load.serves) return last;
  }
  if (!last) throw new RangeError('A boat needs at least one row in its reef table.');
  return last;
}

/** The same with the reef given. */
export function decisionWith(
  prepared: PreparedBoat,
  conditions: Conditions,
  place: Place,
  target: Place,
  present: End | null,
  reefIndex: number,
): Decision {
  const reef = prepared.boat.reefs[reefIndex]!;
  const wind = windOverWater(conditions, reef, prepared.boat);
  const using: SailingConditions = { boat: prepared.boat, reef, wind, streamKn: conditions.streamKn };
  const sailing = sailingToward(place, target, present, using);
  return {
    reefIndex,
    sailing,
    load: loadOf(prepared, reef, sailing.course, wind, conditions.wind),
    with: using,
  };
}
