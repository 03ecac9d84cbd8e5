import * as maplibregl from 'maplibre-gl';
import { Protocol } from 'pmtiles';

let prepared = false;

/** Once a page: tiles come out of one archive, and the worker from a file of our own, as the page's policy demands. */
export function prepareMaplibre(): typeof maplibregl {
  if (!prepared) {
    maplibregl.setWorkerUrl('/maplibre-gl-worker.mjs');
    maplibregl.addProtocol('pmtiles', new Protocol().tile);
    prepared = true;
  }
  return maplibregl;
}
