import type { LimitsDraft, PlanDraft, TimeDraft } from './plan-draft';

/** A wind or stream row as pasted or fetched, before it has an id. */
export interface NewWindRow {
  readonly time: TimeDraft;
  readonly from: string;
  readonly mean: string;
  readonly gust: string;
}

export interface NewStreamRow {
  readonly time: TimeDraft;
  readonly toward: string;
  readonly kn: string;
}

/** Everything that changes the plan. Indices are of the route; ids are of rows. */
export type PlanAction =
  | { readonly type: 'setText'; readonly field: 'name' | 'zone' | 'windSource'; readonly value: string }
  | { readonly type: 'setTime'; readonly field: 'departure' | 'windIssued'; readonly value: TimeDraft }
  | { readonly type: 'setLimit'; readonly field: keyof LimitsDraft; readonly value: string }
  | {
      readonly type: 'setWaypoint';
      readonly id: string;
      readonly field: 'name' | 'lat' | 'lon' | 'corridor';
      readonly value: string;
    }
  | { readonly type: 'addWaypoint'; readonly lat: number; readonly lon: number }
  | { readonly type: 'addEmptyWaypoint' }
  | { readonly type: 'insertWaypoint'; readonly legIndex: number; readonly lat: number; readonly lon: number }
  | { readonly type: 'moveWaypoint'; readonly id: string; readonly lat: number; readonly lon: number }
  | { readonly type: 'deleteWaypoint'; readonly id: string }
  | { readonly type: 'shiftWaypoint'; readonly id: string; readonly by: -1 | 1 }
  | { readonly type: 'reverseRoute' }
  | { readonly type: 'addWindRow' }
  | {
      readonly type: 'setWindRow';
      readonly id: string;
      readonly field: 'from' | 'mean' | 'gust';
      readonly value: string;
    }
  | { readonly type: 'setWindTime'; readonly id: string; readonly value: TimeDraft }
  | { readonly type: 'deleteWindRow'; readonly id: string }
  | { readonly type: 'putWindRows'; readonly rows: readonly NewWindRow[]; readonly replace: boolean }
  | {
      readonly type: 'useForecast';
      readonly source: string;
      readonly issued: TimeDraft;
      readonly rows: readonly NewWindRow[];
    }
  | { readonly type: 'addStreamRow' }
  | { readonly type: 'setStreamRow'; readonly id: string; readonly field: 'toward' | 'kn'; readonly value: string }
  | { readonly type: 'setStreamTime'; readonly id: string; readonly value: TimeDraft }
  | { readonly type: 'deleteStreamRow'; readonly id: string }
  | { readonly type: 'putStreamRows'; readonly rows: readonly NewStreamRow[]; readonly replace: boolean };

/** Typing on in one field is one step of undo: actions with the same key in a row are joined. */
export function joinKey(action: PlanAction): string | null {
  switch (action.type) {
    case 'setText':
    case 'setTime':
    case 'setLimit':
      return `${action.type}:${action.field}`;
    case 'setWaypoint':
    case 'setWindRow':
    case 'setStreamRow':
      return `${action.type}:${action.id}:${action.field}`;
    case 'setWindTime':
    case 'setStreamTime':
      return `${action.type}:${action.id}`;
    default:
      return null;
  }
}

export type ApplyAction<Kind extends PlanAction['type']> = (
  draft: PlanDraft,
  action: Extract<PlanAction, { type: Kind }>,
) => PlanDraft;
