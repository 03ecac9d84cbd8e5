import type { Feature, FeatureCollection, Geometry, Position } from 'geojson';
import type { Box, LandPolygon, LonLat, Ring } from '@/lib/geo/land-file';
import { isBoxEdge } from '@/lib/geo/land-segments';

export interface Place {
  readonly name: string;
  readonly kind: 'mainland' | 'island' | 'water' | 'town';
  /** 1 is drawn first and from furthest away. */
  readonly rank: number;
  readonly lat: number;
  readonly lon: number;
}

export type ChartLayers = Readonly<Record<'sheet' | 'land' | 'shore' | 'frame' | 'places', FeatureCollection>>;

const collect = (features: Feature[]): FeatureCollection => ({ type: 'FeatureCollection', features });
const feature = (geometry: Geometry, properties: Feature['properties'] = {}): Feature => ({
  type: 'Feature',
  properties,
  geometry,
});
const copy = (ring: readonly LonLat[]): Position[] => ring.map((place) => [...place]);

/** A ring's shore: its pieces without those along the edge of the box. */
function shoreLines(ring: Ring, box: Box): LonLat[][] {
  const lines: LonLat[][] = [];
  let line: LonLat[] = [];
  for (let i = 0; i + 1 < ring.length; i++) {
    if (isBoxEdge(ring[i]!, ring[i + 1]!, box)) {
      if (line.length > 1) lines.push(line);
      line = [];
    } else {
      if (line.length === 0) line.push(ring[i]!);
      line.push(ring[i + 1]!);
    }
  }
  if (line.length > 1) lines.push(line);
  return lines;
}

/** What the map draws: the sheet that is known at all, land on it, its shore, the frame around it, names. */
export function chartLayers(polygons: readonly LandPolygon[], box: Box, places: readonly Place[]): ChartLayers {
  const { west, south, east, north } = box;
  const corners: LonLat[] = [
    [west, south],
    [east, south],
    [east, north],
    [west, north],
    [west, south],
  ];
  return {
    sheet: collect([feature({ type: 'Polygon', coordinates: [copy(corners)] })]),
    land: collect(polygons.map((rings) => feature({ type: 'Polygon', coordinates: rings.map(copy) }))),
    shore: collect(
      polygons
        .flat()
        .flatMap((ring) => shoreLines(ring, box))
        .map((line) => feature({ type: 'LineString', coordinates: copy(line) })),
    ),
    frame: collect([
      feature(
        // Clockwise, so that words set on the line's left lie outside.
        { type: 'LineString', coordinates: copy(corners.toReversed()) },
        { name: 'edge of the sample chart · nothing is known beyond' },
      ),
    ]),
    places: collect(
      places.map(({ name, kind, rank, lat, lon }) =>
        feature({ type: 'Point', coordinates: [lon, lat] }, { name, kind, rank }),
      ),
    ),
  };
}
