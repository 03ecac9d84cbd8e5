/**
 * The plan as it is typed: every field a text, so that what cannot be read yet is kept as it stands. Times are
 * texts in the passage's zone; `which` tells the two apart where a clock change makes one happen twice.
 */
export type Which = '' | 'earlier' | 'later';

export interface TimeDraft {
  readonly text: string;
  readonly which: Which;
}

export interface WaypointDraft {
  readonly id: string;
  readonly name: string;
  readonly lat: string;
  readonly lon: string;
  /** Half-width, m, of the corridor of the leg that ends here. */
  readonly corridor: string;
}

export interface WindRowDraft {
  readonly id: string;
  readonly time: TimeDraft;
  readonly from: string;
  readonly mean: string;
  readonly gust: string;
}

export interface StreamRowDraft {
  readonly id: string;
  readonly time: TimeDraft;
  readonly toward: string;
  readonly kn: string;
}

export interface LimitsDraft {
  readonly meanKn: string;
  readonly gustKn: string;
  readonly loadShare: string;
  readonly shuntsPerHour: string;
  readonly hours: string;
  readonly afterDark: '' | 'no' | 'yes';
}

export interface PlanDraft {
  readonly name: string;
  readonly zone: string;
  readonly departure: TimeDraft;
  readonly waypoints: readonly WaypointDraft[];
  readonly windSource: string;
  readonly windIssued: TimeDraft;
  readonly windRows: readonly WindRowDraft[];
  readonly streamRows: readonly StreamRowDraft[];
  readonly limits: LimitsDraft;
  /** Number of the next id given out, so that the reducer needs no randomness. */
  readonly nextId: number;
}

export const NO_TIME: TimeDraft = { text: '', which: '' };

export const NO_LIMITS: LimitsDraft = {
  meanKn: '',
  gustKn: '',
  loadShare: '',
  shuntsPerHour: '',
  hours: '',
  afterDark: '',
};

/** Half-width of a new leg's corridor, m: the schema's own default. */
export const USUAL_CORRIDOR_M = '1000';

export function emptyDraft(name: string, zone: string): PlanDraft {
  return {
    name,
    zone,
    departure: NO_TIME,
    waypoints: [],
    windSource: '',
    windIssued: NO_TIME,
    windRows: [],
    streamRows: [],
    limits: NO_LIMITS,
    nextId: 1,
  };
}
