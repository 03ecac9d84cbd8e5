import type { LegResult, ReefCall } from '@/lib/passages/passage';

export interface PlacedCall extends ReefCall {
  /** The leg whose wind asks for it, counted from 0. */
  readonly legIndex: number;
  readonly from: string;
  readonly to: string;
}

/** All calls of the passage in order of time; one that only carries on with the reef already in is left out. */
export function mergeReefCalls(legs: readonly Pick<LegResult, 'from' | 'to' | 'reefCalls'>[]): PlacedCall[] {
  const all = legs.flatMap((leg, legIndex) =>
    leg.reefCalls.map((call) => ({ ...call, legIndex, from: leg.from, to: leg.to })),
  );
  const inOrder = [...all].sort((a, b) => Date.parse(a.at) - Date.parse(b.at));
  return inOrder.filter((call, i) => i === 0 || call.reef !== inOrder[i - 1]!.reef);
}
