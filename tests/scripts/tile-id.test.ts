import { zxyToTileId } from 'pmtiles';
import { describe, expect, it } from 'vitest';
import { tileId } from '@/scripts/tiles/tile-id';

describe('the place of a tile in an archive', () => {
  it.each([
    // The examples of the PMTiles specification v3.
    [0, 0, 0, 0],
    [1, 0, 0, 1],
    [1, 0, 1, 2],
    [1, 1, 1, 3],
    [1, 1, 0, 4],
    [2, 0, 0, 5],
    [12, 3423, 1763, 19078479],
  ])('%i/%i/%i is %i', (z, x, y, id) => {
    expect(tileId(z, x, y)).toBe(id);
  });

  it('agrees with the pmtiles package over a whole zoom', () => {
    for (let x = 0; x < 32; x++) for (let y = 0; y < 32; y++) expect(tileId(5, x, y)).toBe(zxyToTileId(5, x, y));
  });
});
