import type { CheckState, Flag, LegResult } from '@/lib/passages/passage';

export interface MapPlace {
  readonly lat: number;
  readonly lon: number;
}

export interface MapWaypoint extends MapPlace {
  readonly id: string;
  readonly name: string;
}

/** What the map shows of a checked leg; leg i runs from waypoint i to waypoint i + 1. */
export interface MapLeg {
  readonly track: LegResult['track'];
  readonly state: CheckState;
  readonly flags: readonly Flag[];
}

export interface MapReefCall extends MapPlace {
  readonly label: string;
}
