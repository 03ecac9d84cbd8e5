import { type ChartLayers, chartLayers } from './chart-layers';
import { cutTiles } from './cut-tiles';
import { packLand } from './pack-land';
import { packPmtiles } from './pack-pmtiles';
import { REGION_BOX, WORDS, readPlaces, readRegionLand } from './region';

const MIN_ZOOM = 5;
const MAX_ZOOM = 12;

export interface SampleFiles {
  readonly pmtiles: Buffer;
  readonly land: string;
}

/** The sample map and the sample land data, made from data/sample-region. The same source gives the same files. */
export async function buildSample(): Promise<SampleFiles> {
  const polygons = await readRegionLand();
  const layers: ChartLayers = chartLayers(polygons, REGION_BOX, await readPlaces());
  const metadata = {
    name: 'Sample chart of the San Juan Islands',
    attribution: WORDS.credit,
    licence: WORDS.licence,
    description: WORDS.notice,
    vector_layers: Object.keys(layers).map((id) => ({
      id,
      minzoom: MIN_ZOOM,
      maxzoom: MAX_ZOOM,
      fields: id === 'places' ? { name: 'String', kind: 'String', rank: 'Number' } : {},
    })),
  };
  return {
    pmtiles: packPmtiles(cutTiles(layers, REGION_BOX, MIN_ZOOM, MAX_ZOOM), REGION_BOX, metadata),
    land: `${JSON.stringify(packLand(polygons, REGION_BOX, WORDS))}\n`,
  };
}
