import type { Box, LandFile, LandPolygon, LonLat } from '@/lib/geo/land-file';

/** 1e-5° is about 1 m here, a hundredth of the coastline's own error. */
const PER_DEGREE = 1e5;

/** A ring as steps in whole units; places that fall on the one before are dropped, as is the closing place. */
function packRing(ring: readonly LonLat[]): number[] {
  const steps: number[] = [];
  let x = 0;
  let y = 0;
  for (const [lon, lat] of ring.slice(0, -1)) {
    const dx = Math.round(lon * PER_DEGREE) - x;
    const dy = Math.round(lat * PER_DEGREE) - y;
    if (steps.length > 0 && dx === 0 && dy === 0) continue;
    steps.push(dx, dy);
    x += dx;
    y += dy;
  }
  return steps;
}

/** Land polygons in the compact form that the browser and the server read. */
export function packLand(
  polygons: readonly LandPolygon[],
  box: Box,
  words: Pick<LandFile, 'credit' | 'licence' | 'notice'>,
): LandFile {
  return {
    ...words,
    box,
    perDegree: PER_DEGREE,
    polygons: polygons.map((rings) => rings.map(packRing)),
  };
}
