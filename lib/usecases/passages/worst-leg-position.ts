import type { CheckState, LegResult } from '@/lib/passages/passage';

const worstFirst: readonly CheckState[] = ['beyond', 'unknown', 'thin', 'within'];

/** Index of the leg in the worst state, of several the one with the largest load share; null without legs. */
export function worstLegPosition(legs: readonly Pick<LegResult, 'state' | 'largestLoadShare'>[]): number | null {
  let worst: number | null = null;
  legs.forEach((leg, position) => {
    const before = worst === null ? undefined : legs[worst];
    if (!before || isWorse(leg, before)) worst = position;
  });
  return worst;
}

type Judged = Pick<LegResult, 'state' | 'largestLoadShare'>;

function isWorse(leg: Judged, other: Judged): boolean {
  const rank = worstFirst.indexOf(leg.state) - worstFirst.indexOf(other.state);
  return rank < 0 || (rank === 0 && (leg.largestLoadShare ?? -1) > (other.largestLoadShare ?? -1));
}
