import type { Box, LandFile, LandPolygon, LonLat, Ring } from '@/lib/geo/land-file';

function readRing(steps: readonly number[], perDegree: number): Ring {
  const ring: LonLat[] = [];
  let x = 0;
  let y = 0;
  for (let i = 0; i + 1 < steps.length; i += 2) {
    x += steps[i]!;
    y += steps[i + 1]!;
    ring.push([x / perDegree, y / perDegree]);
  }
  const first = ring[0];
  return first ? [...ring, first] : ring;
}

/** Unpacks a land file into polygons in degrees and the box they are known in. */
export function readLand(file: LandFile): { readonly polygons: readonly LandPolygon[]; readonly box: Box } {
  return {
    polygons: file.polygons.map((rings) => rings.map((steps) => readRing(steps, file.perDegree))),
    box: file.box,
  };
}
