/**
 * The place of a tile in a PMTiles archive: all tiles of the zooms above it, then its step along the Hilbert curve
 * of its own zoom. PMTiles specification v3, §3 "Tile IDs".
 */
export function tileId(z: number, x: number, y: number): number {
  let id = (4 ** z - 1) / 3;
  let [cx, cy] = [x, y];
  for (let side = 2 ** (z - 1); side >= 1; side /= 2) {
    const rx = (cx & side) > 0 ? 1 : 0;
    const ry = (cy & side) > 0 ? 1 : 0;
    id += side * side * ((3 * rx) ^ ry);
    // Turn the quarter so that the curve inside it runs the same way.
    if (ry === 0) {
      if (rx === 1) [cx, cy] = [side - 1 - (cx & (side - 1)), side - 1 - (cy & (side - 1))];
      [cx, cy] = [cy, cx];
    }
  }
  return id;
}
