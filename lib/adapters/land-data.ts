import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { type LandIndex, buildLandIndex } from '@/lib/geo/land';
import type { LandFile } from '@/lib/geo/land-file';
import { readLand } from '@/lib/geo/read-land';

let cached: Promise<LandIndex> | undefined;

async function build(): Promise<LandIndex> {
  // Relative to where the process runs: the project's root under `next start`, in tests and in scripts.
  const file = path.join(process.cwd(), 'public', 'tiles-sample', 'land.json');
  const { polygons, box } = readLand(JSON.parse(await readFile(file, 'utf8')) as LandFile);
  return buildLandIndex(polygons, box);
}

/** The land of the sample region, from the file the browser reads too. Built once a process; a failure is not kept. */
export function loadLandIndex(): Promise<LandIndex> {
  cached ??= build().catch((error: unknown) => {
    cached = undefined;
    throw error;
  });
  return cached;
}
