import 'server-only';
import { loadLandIndex } from '@/lib/adapters/land-data';
import type { LandIndex } from '@/lib/geo/land';
import { log } from '@/lib/web/log';

/** The land for checks; undefined where its file cannot be read, and then every leg says that land was not checked. */
export async function landForChecks(): Promise<LandIndex | undefined> {
  try {
    return await loadLandIndex();
  } catch (error) {
    log.error({ err: error }, 'the land of the sample region cannot be read');
    return undefined;
  }
}
