import { describe, expect, it } from 'vitest';
import { buildLandIndex } from '@/lib/geo/land';
import type { Box, LandPolygon } from '@/lib/geo/land-file';

const BOX: Box = { west: -1, south: 0, east: 1, north: 1 };

/** A closed rectangle ring. */
function rectangle(west: number, south: number, east: number, north: number): [number, number][] {
  return [
    [west, south],
    [east, south],
    [east, north],
    [west, north],
    [west, south],
  ];
}

/** One degree of longitude at the equator on WGS 84, metres: 6378137·π/180. */
const DEGREE_AT_EQUATOR_M = (6_378_137 * Math.PI) / 180;

describe('a land index of plain figures', () => {
  const island = [rectangle(-0.2, 0.4, 0.2, 0.6)];
  const mainland = [rectangle(0.6, 0, 1, 1)];
  const index = buildLandIndex([island, mainland], BOX);

  it('knows land, water and what it does not cover', () => {
    expect(index.isLand({ lat: 0.5, lon: 0 })).toBe(true);
    expect(index.isLand({ lat: 0.5, lon: 0.8 })).toBe(true);
    expect(index.isLand({ lat: 0.5, lon: 0.4 })).toBe(false);
    expect(index.isLand({ lat: 0.5, lon: -0.9 })).toBe(false);
    expect(index.covers({ lat: 0.5, lon: -0.9 })).toBe(true);
    expect(index.covers({ lat: 0.5, lon: -1.01 })).toBe(false);
    expect(index.covers({ lat: -0.01, lon: 0 })).toBe(false);
    expect(index.covers({ lat: Number.NaN, lon: 0 })).toBe(false);
  });

  it('knows land on the very edge of the box', () => {
    for (const [lat, lon] of [
      [0.5, 1],
      [0, 0.8],
      [1, 0.8],
      [0, 1],
      [1, 1],
    ] as const) {
      expect(index.isLand({ lat, lon })).toBe(true);
    }
    expect(index.isLand({ lat: 0.5, lon: -1 })).toBe(false);
    expect(index.isLand({ lat: 1, lon: 0 })).toBe(false);
  });

  it('finds the first shore that a line meets, from either end', () => {
    const west = { lat: 0.5, lon: -0.9 };
    const between = { lat: 0.5, lon: 0.4 };
    expect(index.crossesLand(west, between)?.lon).toBeCloseTo(-0.2, 9);
    expect(index.crossesLand(between, west)?.lon).toBeCloseTo(0.2, 9);
    expect(index.crossesLand(west, { lat: 0.9, lon: -0.3 })).toBeNull();
    expect(index.crossesLand({ lat: 0.5, lon: 0 }, west)).toEqual({ lat: 0.5, lon: 0 });
  });

  it('counts a line along a shore and a line that touches a corner', () => {
    expect(index.crossesLand({ lat: 0.6, lon: -0.5 }, { lat: 0.6, lon: 0.5 })?.lon).toBeCloseTo(-0.2, 9);
    expect(index.crossesLand({ lat: 0.4, lon: -0.5 }, { lat: 0.4, lon: -0.201 })).toBeNull();
  });

  it('takes a line without length for the place itself', () => {
    expect(index.crossesLand({ lat: 0.5, lon: 0.1 }, { lat: 0.5, lon: 0.1 })).toEqual({ lat: 0.5, lon: 0.1 });
    expect(index.crossesLand({ lat: 0.5, lon: 0.4 }, { lat: 0.5, lon: 0.4 })).toBeNull();
  });

  it('measures to the shore, never to the edges of the box', () => {
    expect(index.distanceToShoreM({ lat: 0, lon: 0.4 })).toBeCloseTo(0.2 * DEGREE_AT_EQUATOR_M, 0);
    // On the mainland: its shore is 0.3° away, the edge of the box only 0.1° or less.
    expect(index.distanceToShoreM({ lat: 0.001, lon: 0.9 }) / (0.3 * DEGREE_AT_EQUATOR_M)).toBeCloseTo(1, 4);
  });

  it('lets a line leave the land over the edge of the box without a shore', () => {
    expect(index.crossesLand({ lat: 0.5, lon: 1.2 }, { lat: 0.5, lon: 0.7 })).toBeNull();
    expect(index.crossesLand({ lat: 0.5, lon: 1.2 }, { lat: 0.5, lon: 0.4 })?.lon).toBeCloseTo(0.6, 9);
  });
});

describe('a land index of odd figures', () => {
  it('has water in a hole', () => {
    const ring: LandPolygon = [rectangle(-0.5, 0.2, 0.5, 0.8), rectangle(-0.1, 0.4, 0.1, 0.6)];
    const index = buildLandIndex([ring], BOX);
    expect(index.isLand({ lat: 0.5, lon: 0 })).toBe(false);
    expect(index.isLand({ lat: 0.5, lon: 0.3 })).toBe(true);
    expect(index.crossesLand({ lat: 0.5, lon: 0 }, { lat: 0.5, lon: 0.9 })?.lon).toBeCloseTo(0.1, 9);
  });

  it('keeps land where two polygons overlap', () => {
    const index = buildLandIndex([[rectangle(-0.5, 0.2, 0.1, 0.8)], [rectangle(-0.1, 0.2, 0.5, 0.8)]], BOX);
    expect(index.isLand({ lat: 0.5, lon: 0 })).toBe(true);
  });

  it('answers where there is no land at all', () => {
    const index = buildLandIndex([], BOX);
    expect(index.covers({ lat: 0.5, lon: 0 })).toBe(true);
    expect(index.isLand({ lat: 0.5, lon: 0 })).toBe(false);
    expect(index.crossesLand({ lat: 0, lon: -1 }, { lat: 1, lon: 1 })).toBeNull();
    expect(index.distanceToShoreM({ lat: 0.5, lon: 0 })).toBe(Infinity);
  });
});
