import { STATES_WORST_FIRST } from '@/lib/passage-check/worst-of';
import type { LegResult } from '@/lib/passages/passage';

type Judged = Pick<LegResult, 'state' | 'largestLoadShare'>;

/** Index of the leg in the worst state, of several the one with the largest load share; null without legs. */
export function worstLegPosition(legs: readonly Judged[]): number | null {
  let worst: number | null = null;
  legs.forEach((leg, position) => {
    const before = worst === null ? undefined : legs[worst];
    if (!before || isWorse(leg, before)) worst = position;
  });
  return worst;
}

function isWorse(leg: Judged, other: Judged): boolean {
  const rank = STATES_WORST_FIRST.indexOf(leg.state) - STATES_WORST_FIRST.indexOf(other.state);
  return rank < 0 || (rank === 0 && (leg.largestLoadShare ?? -1) > (other.largestLoadShare ?? -1));
}
