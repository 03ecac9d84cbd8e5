import type { Box, LandPolygon, LonLat } from '@/lib/geo/land-file';
import type { Segments } from '@/lib/geo/segments';

/** Places within this of the box's edge, in degrees, are on it: about 0.1 m, under the files' own rounding. */
const ON_EDGE_DEG = 1e-6;

export interface LandSegments extends Segments {
  /** Which polygon each piece bounds. */
  readonly polygonOf: Uint32Array;
  /** 1 for shore; 0 for a piece that only closes a polygon along the edge of the box. */
  readonly isCoast: Uint8Array;
}

/** Lies the piece between two places along one edge of the box, where the data was cut? */
export function isBoxEdge(a: LonLat, b: LonLat, box: Box): boolean {
  const on = (value: number, edge: number) => Math.abs(value - edge) <= ON_EDGE_DEG;
  return (
    (on(a[0], box.west) && on(b[0], box.west)) ||
    (on(a[0], box.east) && on(b[0], box.east)) ||
    (on(a[1], box.south) && on(b[1], box.south)) ||
    (on(a[1], box.north) && on(b[1], box.north))
  );
}

/** All pieces of all rings, laid on a plane. */
export function layOutLand(
  polygons: readonly LandPolygon[],
  box: Box,
  toPlane: (place: LonLat) => { readonly east: number; readonly north: number },
): LandSegments {
  const count = polygons.flat().reduce((sum, ring) => sum + Math.max(0, ring.length - 1), 0);
  const laid: LandSegments = {
    count,
    x1: new Float64Array(count),
    y1: new Float64Array(count),
    x2: new Float64Array(count),
    y2: new Float64Array(count),
    polygonOf: new Uint32Array(count),
    isCoast: new Uint8Array(count),
  };
  let i = 0;
  polygons.forEach((rings, polygon) => {
    for (const ring of rings) {
      const placed = ring.map(toPlane);
      for (let k = 0; k + 1 < ring.length; k++) {
        const a = placed[k]!;
        const b = placed[k + 1]!;
        laid.x1[i] = a.east;
        laid.y1[i] = a.north;
        laid.x2[i] = b.east;
        laid.y2[i] = b.north;
        laid.polygonOf[i] = polygon;
        laid.isCoast[i] = isBoxEdge(ring[k]!, ring[k + 1]!, box) ? 0 : 1;
        i++;
      }
    }
  });
  return laid;
}
