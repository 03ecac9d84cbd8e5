import { type LandIndex, buildLandIndex } from '@/lib/geo/land';
import type { LandFile } from '@/lib/geo/land-file';
import { readLand } from '@/lib/geo/read-land';

export const LAND_URL = '/tiles-sample/land.json';

let cached: Promise<LandIndex> | undefined;

async function fetchAndBuild(): Promise<LandIndex> {
  const response = await fetch(LAND_URL);
  if (!response.ok) throw new Error(`The land data could not be read: answer ${response.status}.`);
  const { polygons, box } = readLand((await response.json()) as LandFile);
  return buildLandIndex(polygons, box);
}

/** The land of the sample region, for page or worker. Built once; after a failure the next call tries again. */
export function loadLand(): Promise<LandIndex> {
  cached ??= fetchAndBuild().catch((error: unknown) => {
    cached = undefined;
    throw error;
  });
  return cached;
}
