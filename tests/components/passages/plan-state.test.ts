import { describe, expect, it } from 'vitest';
import { draftFromPlan } from '@/components/passages/draft-from-plan';
import { emptyDraft } from '@/components/passages/plan-draft';
import {
  isUnsaved,
  planReducer,
  startPlanState,
  type PlanState,
  type PlanStateAction,
} from '@/components/passages/plan-state';
import { buildPlan } from '../../builders/check-result';

const run = (state: PlanState, ...actions: PlanStateAction[]) => actions.reduce(planReducer, state);
const names = (state: PlanState) => state.present.waypoints.map((waypoint) => waypoint.name);
const start = () => startPlanState(draftFromPlan(buildPlan(), 'UTC'));
const idOf = (state: PlanState, index: number) => state.present.waypoints[index]!.id;

describe('planReducer', () => {
  it('adds waypoints at the end, with ids and names of their own', () => {
    const state = run(
      startPlanState(emptyDraft('x', 'UTC')),
      { type: 'addWaypoint', lat: 48.123456789, lon: -123 },
      { type: 'addWaypoint', lat: 48.2, lon: -123.1 },
    );
    expect(names(state)).toEqual(['Waypoint 1', 'Waypoint 2']);
    expect(state.present.waypoints[0]).toMatchObject({ lat: '48.12346', lon: '-123', corridor: '1000' });
    expect(idOf(state, 0)).not.toBe(idOf(state, 1));
  });

  it('inserts in a leg and gives the new half the room of the old leg', () => {
    const state = run(start(), { type: 'insertWaypoint', legIndex: 1, lat: 48.51, lon: -123.05 });
    expect(names(state)).toEqual(['the beach', 'the point', 'Waypoint 4', 'the narrows']);
    expect(state.present.waypoints[2]!.corridor).toBe('500');
  });

  it('moves, reorders, turns round and deletes', () => {
    const first = start();
    const moved = run(first, { type: 'moveWaypoint', id: idOf(first, 1), lat: 48.5, lon: -123.01 });
    expect(moved.present.waypoints[1]).toMatchObject({ lat: '48.5', lon: '-123.01' });
    expect(names(run(first, { type: 'shiftWaypoint', id: idOf(first, 2), by: -1 }))).toEqual([
      'the beach',
      'the narrows',
      'the point',
    ]);
    const turned = run(first, { type: 'reverseRoute' });
    expect(names(turned)).toEqual(['the narrows', 'the point', 'the beach']);
    expect(turned.present.waypoints.map((waypoint) => waypoint.corridor)).toEqual(['1000', '500', '1000']);
    expect(names(run(first, { type: 'deleteWaypoint', id: idOf(first, 0) }))).toEqual(['the point', 'the narrows']);
  });

  it('does nothing and remembers nothing where a waypoint cannot go further', () => {
    const first = start();
    expect(run(first, { type: 'shiftWaypoint', id: idOf(first, 0), by: -1 })).toBe(first);
  });

  it('undoes and redoes, and forgets what was undone at the next change', () => {
    const first = start();
    const two = run(first, { type: 'addWaypoint', lat: 48, lon: -123 }, { type: 'addWaypoint', lat: 48.1, lon: -123 });
    const back = run(two, { type: 'undo' }, { type: 'undo' });
    expect(back.present).toBe(first.present);
    expect(run(back, { type: 'undo' })).toBe(back);
    expect(run(back, { type: 'redo' }, { type: 'redo' }).present).toBe(two.present);
    const other = run(back, { type: 'reverseRoute' });
    expect(run(other, { type: 'redo' })).toBe(other);
  });

  it('joins typing on in one field into one step, and keeps fields apart', () => {
    const first = start();
    const id = idOf(first, 0);
    const typed = run(
      first,
      { type: 'setWaypoint', id, field: 'lat', value: '48' },
      { type: 'setWaypoint', id, field: 'lat', value: '48.7' },
      { type: 'setWaypoint', id, field: 'lon', value: '-123.2' },
    );
    expect(typed.past).toHaveLength(2);
    expect(run(typed, { type: 'undo' }).present.waypoints[0]).toMatchObject({ lat: '48.7', lon: '-123' });
  });

  it('keeps what cannot be read, and knows what is saved', () => {
    const first = start();
    const typed = run(first, { type: 'setLimit', field: 'gustKn', value: 'lots' });
    expect(typed.present.limits.gustKn).toBe('lots');
    expect(isUnsaved(typed)).toBe(true);
    expect(isUnsaved(run(typed, { type: 'undo' }))).toBe(false);
    const saved = run(typed, { type: 'saved', draft: typed.present });
    expect(isUnsaved(saved)).toBe(false);
    expect(isUnsaved(run(saved, { type: 'undo' }))).toBe(true);
  });

  it('adds wind rows three hours apart by the zone’s clocks, puts pasted ones in place, takes a forecast', () => {
    const first = start();
    const added = run(first, { type: 'addWindRow' });
    expect(added.present.windRows[2]!.time.text).toBe('2026-06-01 17:00');
    const row = { time: { text: 'x', which: '' as const }, from: '1', mean: '2', gust: '' };
    expect(run(first, { type: 'putWindRows', rows: [row], replace: true }).present.windRows).toHaveLength(1);
    const taken = run(first, { type: 'useForecast', source: 'sample', issued: row.time, rows: [row, row] });
    expect(taken.present).toMatchObject({ windSource: 'sample', windIssued: row.time });
    expect(new Set(taken.present.windRows.map((one) => one.id)).size).toBe(2);
  });
});
