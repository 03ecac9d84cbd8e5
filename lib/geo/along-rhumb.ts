import { mercatorOffsetM } from '@/lib/geo/mercator';
import type { Position } from '@/lib/geo/position';

/**
 * The place a fraction of the way along the straight line from a to b on the Mercator plane, which is the rhumb line
 * between them. The fraction is of the plane's length; on the ground it differs by about 1 % in a degree of latitude.
 */
export function alongRhumb(a: Position, b: Position, fraction: number): Position {
  const north = mercatorOffsetM(a, b).north;
  const lon = a.lon + fraction * (b.lon - a.lon);
  if (north === 0) return { lat: a.lat, lon };
  // Latitude is so nearly linear in the northing that two corrections reach a micrometre on a leg of 100 nmi.
  let lat = a.lat + fraction * (b.lat - a.lat);
  for (let i = 0; i < 2; i++) {
    lat += ((fraction * north - mercatorOffsetM(a, { lat, lon: a.lon }).north) / north) * (b.lat - a.lat);
  }
  return { lat, lon };
}
