import { bbox, multiPoint } from '@turf/turf';
import type { MapPlace } from './map-types';

/** The middle of the sample chart's islands, for a passage without waypoints. */
const ISLANDS: readonly MapPlace[] = [
  { lat: 48.32, lon: -123.35 },
  { lat: 48.78, lon: -122.6 },
];
const PADDING = { top: 64, right: 64, bottom: 72, left: 64 };

/** What the map shows first: the whole passage, or the islands. */
export function viewOf(waypoints: readonly MapPlace[]): {
  readonly bounds: [number, number, number, number];
  readonly fitBoundsOptions: { readonly padding: typeof PADDING; readonly maxZoom: number };
} {
  const places = waypoints.length > 0 ? waypoints : ISLANDS;
  const [west, south, east, north] = bbox(multiPoint(places.map(({ lon, lat }) => [lon, lat])));
  return {
    bounds: [west, south, east, north],
    fitBoundsOptions: { padding: PADDING, maxZoom: 11 },
  };
}
