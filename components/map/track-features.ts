import { featureCollection, lineString, point } from '@turf/turf';
import type { FeatureCollection, LineString, Point, Position } from 'geojson';
import { alongRhumb } from '@/lib/geo/along-rhumb';
import type { MapLeg, MapPlace } from './map-types';

/** The straight plan from waypoint to waypoint, one line a leg. */
export function planFeatures(
  waypoints: readonly MapPlace[],
  selectedLeg: number | null,
): FeatureCollection<LineString> {
  return featureCollection(
    waypoints.slice(1).map((to, leg) => {
      const from = waypoints[leg]!;
      const line = [
        [from.lon, from.lat],
        [to.lon, to.lat],
      ];
      return lineString(line, { leg, selected: leg === selectedLeg });
    }),
  );
}

/** The way sailed, cut where the leading end changes. A leg not sailed has no piece: its plan line is all there is. */
export function trackFeatures(legs: readonly MapLeg[], selectedLeg: number | null): FeatureCollection<LineString> {
  return featureCollection(
    legs.flatMap(({ track, state }, leg) => {
      const pieces: { end: 'A' | 'B'; line: Position[] }[] = [];
      for (let i = 0; i + 1 < track.length; i++) {
        const [lon, lat, , end] = track[i]!;
        const last = pieces.at(-1);
        const piece = last?.end === end ? last : { end, line: [[lon, lat]] };
        if (piece !== last) pieces.push(piece);
        piece.line.push([track[i + 1]![0], track[i + 1]![1]]);
      }
      return pieces.map(({ end, line }) => lineString(line, { leg, end, state, selected: leg === selectedLeg }));
    }),
  );
}

/** One mark a leg with its state, a third of the way along, clear of the handle in the middle. */
export function stateFeatures(legs: readonly MapLeg[], waypoints: readonly MapPlace[]): FeatureCollection<Point> {
  return featureCollection(
    legs.flatMap(({ track, state }, leg) => {
      const from = waypoints[leg];
      const to = waypoints[leg + 1];
      const third = track[Math.round((track.length - 1) * 0.3)];
      const onPlan = from && to ? alongRhumb(from, to, 0.3) : undefined;
      const place = third && track.length > 3 ? [third[0], third[1]] : onPlan && [onPlan.lon, onPlan.lat];
      if (!place) return [];
      return [point(place, { leg, state })];
    }),
  );
}
