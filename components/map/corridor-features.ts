import type { FeatureCollection, Polygon } from 'geojson';
import { normaliseDeg } from '@/lib/geo/angles';
import { rhumbDirect, rhumbInverse } from '@/lib/geo/rhumb';
import type { Metres } from '@/lib/units/quantities';
import type { MapPlace } from './map-types';

/** The room each leg allows to both sides, as a four-cornered figure about its rhumb line. */
export function corridorFeatures(
  waypoints: readonly MapPlace[],
  halfWidthsM: readonly Metres[],
): FeatureCollection<Polygon> {
  return {
    type: 'FeatureCollection',
    features: waypoints.slice(1).flatMap((to, leg) => {
      const from = waypoints[leg]!;
      const halfWidth = halfWidthsM[leg];
      const { courseDeg, distanceM } = rhumbInverse(from, to);
      if (!halfWidth || distanceM === 0) return [];
      const corner = (place: MapPlace, side: number) => {
        const { lat, lon } = rhumbDirect(place, normaliseDeg(courseDeg + side), halfWidth);
        return [lon, lat];
      };
      const first = corner(from, -90);
      const coordinates = [[first, corner(to, -90), corner(to, 90), corner(from, 90), first]];
      return [{ type: 'Feature' as const, properties: { leg }, geometry: { type: 'Polygon' as const, coordinates } }];
    }),
  };
}
