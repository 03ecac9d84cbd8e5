import { describe, expect, it } from 'vitest';
import { corridorFeatures } from '@/components/map/corridor-features';
import { markFeatures } from '@/components/map/mark-features';
import { nudge } from '@/components/map/nudge';
import { viewOf } from '@/components/map/view-of';
import { rhumbInverse } from '@/lib/geo/rhumb';
import type { Flag } from '@/lib/passages/passage';

const flag = (code: Flag['code'], severity: Flag['severity'], placed = true): Flag => ({
  code,
  severity,
  at: null,
  lat: placed ? 48.5 : null,
  lon: placed ? -123 : null,
  numbers: {},
});

describe('marks', () => {
  it('are drawn for flags with a place, land apart, notices not at all', () => {
    const flags = [
      flag('beyond-righting-moment', 'danger'),
      flag('land-on-track', 'danger'),
      flag('little-margin', 'caution'),
      flag('after-dark', 'notice'),
      flag('forecast-old', 'caution', false),
    ];
    const { features } = markFeatures([], [], [{ state: 'beyond', track: [], flags }], null);
    expect(features.map((mark) => mark.properties?.['mark'])).toEqual(['flag-danger', 'flag-land', 'flag-caution']);
  });

  it('carry the words of a reef call', () => {
    const place = { lat: 48.5, lon: -123 };
    const { features } = markFeatures([place], [{ ...place, label: 'first reef 14:20' }], [], place);
    expect(features.map((mark) => mark.properties)).toEqual([
      { mark: 'shunt', label: '' },
      { mark: 'reef-call', label: 'first reef 14:20' },
      { mark: 'focus', label: '' },
    ]);
  });
});

describe('an arrow key', () => {
  it.each([
    ['ArrowUp', 0],
    ['ArrowRight', 90],
    ['ArrowDown', 180],
    ['ArrowLeft', 270],
  ])('%s moves 50 m toward %i°, with Shift 500 m', (key, course) => {
    const place = { lat: 48.5, lon: -123 };
    for (const [long, metres] of [
      [false, 50],
      [true, 500],
    ] as const) {
      const { courseDeg, distanceM } = rhumbInverse(place, nudge(place, key, long)!);
      expect(distanceM).toBeCloseTo(metres, 3);
      expect(Math.abs(((courseDeg - course + 540) % 360) - 180)).toBeLessThan(1e-6);
    }
  });

  it('alone does: other keys leave the waypoint', () => {
    expect(nudge({ lat: 48.5, lon: -123 }, 'Enter', false)).toBeNull();
  });
});

describe('corridors', () => {
  const from = { lat: 48.4, lon: -123.2 };
  const to = { lat: 48.6, lon: -123 };

  it('stand half their width to each side of both ends', () => {
    const ring = corridorFeatures([from, to], [1200]).features[0]!.geometry.coordinates[0]!;
    expect(ring).toHaveLength(5);
    const away = ring.map(([lon, lat], i) => rhumbInverse([from, to, to, from, from][i]!, { lat: lat!, lon: lon! }));
    for (const { distanceM } of away) expect(distanceM).toBeCloseTo(1200, 3);
    const { courseDeg } = rhumbInverse(from, to);
    expect(away[0]!.courseDeg).toBeCloseTo(courseDeg - 90 + 360, 6);
    expect(away[2]!.courseDeg).toBeCloseTo(courseDeg + 90, 6);
  });

  it('are left out where a width is not known or the leg has no length', () => {
    expect(corridorFeatures([from, to], []).features).toEqual([]);
    expect(corridorFeatures([from, from], [1200]).features).toEqual([]);
    expect(corridorFeatures([from, to], [Number.NaN]).features).toEqual([]);
  });
});

describe('what the map shows first', () => {
  it('is the whole passage', () => {
    expect(
      viewOf([
        { lat: 48.4, lon: -123 },
        { lat: 48.6, lon: -123.2 },
      ]).bounds,
    ).toEqual([-123.2, 48.4, -123, 48.6]);
  });

  it('is the islands where there is no passage yet', () => {
    const [west, south, east, north] = viewOf([]).bounds;
    expect(west).toBeLessThan(-123.1);
    expect(east).toBeGreaterThan(-122.8);
    expect(south).toBeLessThan(48.45);
    expect(north).toBeGreaterThan(48.7);
  });
});
