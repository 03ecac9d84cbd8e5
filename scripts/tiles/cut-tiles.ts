import type { FeatureCollection } from 'geojson';
import GeoJSONVT, { type LegacyTile } from 'geojson-vt';
import vtpbf from 'vt-pbf';
import type { Box } from '@/lib/geo/land-file';
import type { Tile } from './pack-pmtiles';

const EXTENT = 4096;
/** Wider than the library's own 64, so that a thick shore line shows no seam. */
const BUFFER = 128;

/** Column and row of the tile that holds a place. Web Mercator, rows counted from the north. */
function tileOf(lon: number, lat: number, z: number): { x: number; y: number } {
  const phi = (lat * Math.PI) / 180;
  return {
    x: Math.floor(((lon + 180) / 360) * 2 ** z),
    y: Math.floor(((1 - Math.asinh(Math.tan(phi)) / Math.PI) / 2) * 2 ** z),
  };
}

/** Cuts layers into vector tiles over a box. Tiles with nothing in them are left out. */
export function cutTiles(
  layers: Readonly<Record<string, FeatureCollection>>,
  box: Box,
  minZoom: number,
  maxZoom: number,
): Tile[] {
  const cutters = Object.entries(layers).map(
    ([name, data]) =>
      [name, new GeoJSONVT(data, { maxZoom, indexMaxZoom: 5, extent: EXTENT, buffer: BUFFER, tolerance: 3 })] as const,
  );
  const tiles: Tile[] = [];
  for (let z = minZoom; z <= maxZoom; z++) {
    const northWest = tileOf(box.west, box.north, z);
    const southEast = tileOf(box.east, box.south, z);
    for (let x = northWest.x; x <= southEast.x; x++) {
      for (let y = northWest.y; y <= southEast.y; y++) {
        const cut: Record<string, LegacyTile> = {};
        for (const [name, cutter] of cutters) {
          const tile = cutter.getTile(z, x, y);
          if (tile && tile.features.length > 0) cut[name] = tile;
        }
        if (Object.keys(cut).length > 0) {
          tiles.push({ z, x, y, data: vtpbf.fromGeojsonVt(cut, { version: 2, extent: EXTENT }) });
        }
      }
    }
  }
  return tiles;
}
