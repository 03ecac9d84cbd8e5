import { describe, expect, it } from 'vitest';
import { planFeatures, stateFeatures, trackFeatures } from '@/components/map/track-features';
import type { MapLeg } from '@/components/map/map-types';

const at = (lon: number, end: 'A' | 'B') => [lon, 48.5, '2026-07-01T10:00:00.000Z', end] as const;
const boards: MapLeg = {
  state: 'thin',
  flags: [],
  track: [at(-123.3, 'A'), at(-123.2, 'A'), at(-123.1, 'B'), at(-123.0, 'A'), at(-122.9, 'A')],
};
const notReached: MapLeg = { state: 'unknown', flags: [], track: [] };
const waypoints = [
  { lat: 48.5, lon: -123.3 },
  { lat: 48.5, lon: -122.9 },
  { lat: 48.6, lon: -122.9 },
];

describe('the way sailed', () => {
  it('is cut where the leading end changes, each piece meeting the next', () => {
    const { features } = trackFeatures([boards], null);
    expect(features.map((piece) => piece.properties?.['end'])).toEqual(['A', 'B', 'A']);
    expect(features.map((piece) => piece.geometry.coordinates.map(([lon]) => lon))).toEqual([
      [-123.3, -123.2, -123.1],
      [-123.1, -123.0],
      [-123.0, -122.9],
    ]);
  });

  it('tells the leg, its state and whether it is selected', () => {
    const { features } = trackFeatures([notReached, boards], 1);
    expect(features[0]?.properties).toEqual({ leg: 1, end: 'A', state: 'thin', selected: true });
    expect(trackFeatures([notReached, boards], 0).features[0]?.properties).toMatchObject({ selected: false });
  });

  it('draws nothing of a leg that is not sailed', () => {
    expect(trackFeatures([notReached], null).features).toEqual([]);
  });
});

describe('the line planned', () => {
  it('has one piece a leg, and none for a single waypoint', () => {
    expect(planFeatures(waypoints, 1).features.map((piece) => piece.properties)).toEqual([
      { leg: 0, selected: false },
      { leg: 1, selected: true },
    ]);
    expect(planFeatures(waypoints.slice(0, 1), null).features).toEqual([]);
  });
});

describe("the legs' states", () => {
  it('stand on the way sailed, or on the line planned where the leg is not sailed', () => {
    const [sailed, planned] = stateFeatures([boards, notReached], waypoints).features;
    expect(sailed?.properties).toEqual({ leg: 0, state: 'thin' });
    expect(sailed?.geometry.coordinates).toEqual([-123.2, 48.5]);
    expect(planned?.properties).toEqual({ leg: 1, state: 'unknown' });
    expect(planned?.geometry.coordinates[0]).toBe(-122.9);
    expect(planned?.geometry.coordinates[1]).toBeCloseTo(48.53, 3);
  });

  it('draw nothing for a leg whose waypoint is gone', () => {
    expect(stateFeatures([boards, notReached, notReached], waypoints.slice(0, 2)).features).toHaveLength(1);
  });
});
