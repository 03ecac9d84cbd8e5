import { readFile } from 'node:fs/promises';
import path from 'node:path';
import type { FeatureCollection, Polygon } from 'geojson';
import type { Box, LandPolygon, LonLat } from '@/lib/geo/land-file';
import type { Place } from './chart-layers';

export const SOURCE_DIR = path.join(import.meta.dirname, '../../data/sample-region');

/** Where the source coastline was cut. Outside it nothing is known. */
export const REGION_BOX: Box = { west: -124, south: 48.05, east: -122.3, north: 49 };

export const WORDS = {
  credit: 'Coastline: GSHHG 2.3.7, P. Wessel & W. H. F. Smith (LGPL-3.0-or-later)',
  licence: 'LGPL-3.0-or-later; see LICENCE-land.txt',
  notice: 'Sample chart: not for navigation. No depths; small islets and rocks are missing; errors of about 100 m.',
} as const;

/** The land polygons of the source data. */
export async function readRegionLand(): Promise<LandPolygon[]> {
  const source = JSON.parse(
    await readFile(path.join(SOURCE_DIR, 'land.geojson'), 'utf8'),
  ) as FeatureCollection<Polygon>;
  return source.features.map((feature) => feature.geometry.coordinates as unknown as LonLat[][]);
}

/** Names to draw on the map. */
export async function readPlaces(): Promise<readonly Place[]> {
  const source = JSON.parse(await readFile(path.join(SOURCE_DIR, 'places.json'), 'utf8')) as { places: Place[] };
  return source.places;
}
