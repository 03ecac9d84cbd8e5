import { featureCollection, point } from '@turf/turf';
import type { Feature, FeatureCollection, Point } from 'geojson';
import type { MapLeg, MapPlace, MapReefCall } from './map-types';
import type { MarkName } from './marks';

function mark(place: MapPlace, name: MarkName, label = ''): Feature<Point> {
  return point([place.lon, place.lat], { mark: name, label });
}

function flagMark(code: string, severity: string): MarkName {
  if (code === 'land-on-track') return 'flag-land';
  return severity === 'danger' ? 'flag-danger' : 'flag-caution';
}

/** Shunts, reef calls and flags with a place, in the order they are drawn: the most urgent last. */
export function markFeatures(
  shunts: readonly MapPlace[],
  reefCalls: readonly MapReefCall[],
  legs: readonly MapLeg[],
  focus: MapPlace | null,
): FeatureCollection<Point> {
  const flags = legs.flatMap((leg) =>
    leg.flags.flatMap(({ lat, lon, code, severity }) =>
      lat === null || lon === null || severity === 'notice' ? [] : [mark({ lat, lon }, flagMark(code, severity))],
    ),
  );
  return featureCollection([
    ...shunts.map((place) => mark(place, 'shunt')),
    ...reefCalls.map((call) => mark(call, 'reef-call', call.label)),
    ...flags,
    ...(focus ? [mark(focus, 'focus')] : []),
  ]);
}
