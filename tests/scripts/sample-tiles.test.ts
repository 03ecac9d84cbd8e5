import { readFile } from 'node:fs/promises';
import { PMTiles, type RangeResponse, type Source, TileType } from 'pmtiles';
import { beforeAll, describe, expect, it } from 'vitest';
import { loadLandIndex } from '@/lib/adapters/land-data';
import { type SampleFiles, buildSample } from '@/scripts/tiles/build-sample';
import { REGION_BOX, readPlaces } from '@/scripts/tiles/region';

const KEPT = 'public/tiles-sample';

/** An archive in memory, read by the pmtiles package: an implementation of the format that is not ours. */
function archive(bytes: Buffer): PMTiles {
  const source: Source = {
    getKey: () => 'memory',
    getBytes: (offset, length): Promise<RangeResponse> =>
      Promise.resolve({ data: new Uint8Array(bytes.subarray(offset, offset + length)).buffer }),
  };
  return new PMTiles(source);
}

async function everyTile(bytes: Buffer): Promise<Map<string, Buffer>> {
  const tiles = new Map<string, Buffer>();
  const from = archive(bytes);
  for (let z = 4; z <= 13; z++) {
    const column = (lon: number) => Math.floor(((lon + 180) / 360) * 2 ** z);
    const row = (lat: number) => Math.floor(((1 - Math.asinh(Math.tan((lat * Math.PI) / 180)) / Math.PI) / 2) * 2 ** z);
    for (let x = column(REGION_BOX.west) - 1; x <= column(REGION_BOX.east) + 1; x++) {
      for (let y = row(REGION_BOX.north) - 1; y <= row(REGION_BOX.south) + 1; y++) {
        const tile = await from.getZxy(z, x, y);
        if (tile) tiles.set(`${z}/${x}/${y}`, Buffer.from(tile.data));
      }
    }
  }
  return tiles;
}

describe('the sample map', () => {
  let built: SampleFiles;
  let keptTiles: Buffer;
  beforeAll(async () => {
    built = await buildSample();
    keptTiles = await readFile(`${KEPT}/san-juan.pmtiles`);
  });

  it('keeps the land data that its source makes', async () => {
    expect((await readFile(`${KEPT}/land.json`, 'utf8')) === built.land).toBe(true);
  });

  it('keeps the tiles that its source makes', async () => {
    // Tile by tile and unpacked: another Node.js may pack the same bytes otherwise.
    const [kept, made] = [await everyTile(keptTiles), await everyTile(built.pmtiles)];
    expect([...kept.keys()]).toEqual([...made.keys()]);
    expect([...kept].filter(([key, bytes]) => !made.get(key)!.equals(bytes)).map(([key]) => key)).toEqual([]);
  });

  it('is an archive that another reader understands', async () => {
    const header = await archive(keptTiles).getHeader();
    expect(header).toMatchObject({ specVersion: 3, tileType: TileType.Mvt, minZoom: 5, maxZoom: 12, clustered: true });
    expect([header.minLon, header.minLat, header.maxLon, header.maxLat]).toEqual([-124, 48.05, -122.3, 49]);
    const tiles = await everyTile(keptTiles);
    expect(tiles.size).toBe(header.numAddressedTiles);
    expect([...tiles.keys()].some((key) => key.startsWith('4/') || key.startsWith('13/'))).toBe(false);
  });

  it('says whose coastline it is and what it is not for', async () => {
    const metadata = (await archive(keptTiles).getMetadata()) as Record<string, string>;
    expect(metadata['attribution']).toContain('GSHHG 2.3.7, P. Wessel & W. H. F. Smith');
    expect(metadata['description']).toContain('not for navigation');
    expect(await readFile(`${KEPT}/LICENCE-land.txt`, 'utf8')).toContain('License: LGPL-3+');
  });

  it('names islands and towns on land and waters on water', async () => {
    const index = await loadLandIndex();
    const wrong = (await readPlaces()).filter(
      (place) => !index.covers(place) || index.isLand(place) !== (place.kind !== 'water'),
    );
    expect(wrong.map((place) => place.name)).toEqual([]);
  });
});
