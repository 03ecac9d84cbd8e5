import { rhumbInverse } from '@/lib/geo/rhumb';
import { breakpointsOf } from '@/lib/passages/conditions';
import { followLeg, type Cursor } from '@/lib/passages/follow-leg';
import type { Passage } from '@/lib/passages/passage';
import { prepareBoat, type PreparedBoat } from '@/lib/passages/prepared-boat';
import type { FollowedLeg } from '@/lib/passages/sample';
import type { Corridor } from '@/lib/passages/turns';
import { METRES_PER_NMI } from '@/lib/units/constants';
import type { NauticalMiles } from '@/lib/units/quantities';

export interface PassageLeg {
  readonly from: string;
  readonly to: string;
  readonly corridor: Corridor;
  readonly distanceNmi: NauticalMiles;
  /** Null where the passage was never followed so far. */
  readonly followed: FollowedLeg | null;
}

export interface FollowedPassage {
  readonly prepared: PreparedBoat;
  readonly legs: readonly PassageLeg[];
}

/** Sails the whole route on paper, leg by leg, until it arrives or until something needed is not known. */
export function followPassage(passage: Passage): FollowedPassage {
  const prepared = prepareBoat(passage.boat);
  const voyage = { passage, prepared, breakpoints: breakpointsOf(passage) };
  const first = passage.route[0];
  if (!first) throw new RangeError('A route needs at least two waypoints.');
  let cursor: Cursor = { lat: first.lat, lon: first.lon, time: passage.departure, end: null, slowSince: null };
  let stopped = false;
  const legs = passage.route.slice(1).map((target, index): PassageLeg => {
    const start = passage.route[index]!;
    const { courseDeg, distanceM } = rhumbInverse(start, target);
    const corridor: Corridor = { start, target, courseDeg, halfWidthM: target.corridorHalfWidthM };
    const leg = { from: start.name, to: target.name, corridor, distanceNmi: distanceM / METRES_PER_NMI };
    if (stopped) return { ...leg, followed: null };
    const sailed = followLeg(voyage, cursor, corridor);
    cursor = sailed.cursor;
    stopped = sailed.leg.stop !== null;
    return { ...leg, followed: sailed.leg };
  });
  return { prepared, legs };
}
