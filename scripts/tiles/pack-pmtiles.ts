import { createHash } from 'node:crypto';
import { gzipSync } from 'node:zlib';
import type { Box } from '@/lib/geo/land-file';
import { type DirectoryEntry, packDirectory } from './pmtiles-directory';
import { tileId } from './tile-id';

export interface Tile {
  readonly z: number;
  readonly x: number;
  readonly y: number;
  /** Mapbox vector tile, not compressed. */
  readonly data: Uint8Array;
}

const HEADER_BYTES = 127;
/** A reader fetches the first 16 KiB in one go and expects the root directory whole in them. */
const ROOT_LIMIT_BYTES = 16_384;
const GZIP = 2;
const VECTOR_TILE = 1;

/**
 * A PMTiles v3 archive of vector tiles in one file: header, root directory, metadata, tile data. Small archives only:
 * there are no leaf directories. Equal tiles are kept once.
 * @throws RangeError where the root directory would not fit the first 16 KiB.
 */
export function packPmtiles(tiles: readonly Tile[], box: Box, metadata: Readonly<Record<string, unknown>>): Buffer {
  const sorted = tiles.map((tile) => ({ ...tile, id: tileId(tile.z, tile.x, tile.y) })).sort((a, b) => a.id - b.id);
  const contents: Buffer[] = [];
  const kept = new Map<string, { offset: number; length: number }>();
  const entries: DirectoryEntry[] = [];
  let end = 0;
  for (const tile of sorted) {
    const hash = createHash('sha256').update(tile.data).digest('hex');
    let at = kept.get(hash);
    if (!at) {
      const packed = gzipSync(tile.data, { level: 9 });
      at = { offset: end, length: packed.length };
      kept.set(hash, at);
      contents.push(packed);
      end += packed.length;
    }
    const last = entries.at(-1);
    if (last && last.offset === at.offset && last.id + last.runLength === tile.id) {
      entries[entries.length - 1] = { ...last, runLength: last.runLength + 1 };
    } else {
      entries.push({ id: tile.id, runLength: 1, ...at });
    }
  }
  const root = gzipSync(packDirectory(entries), { level: 9 });
  if (HEADER_BYTES + root.length > ROOT_LIMIT_BYTES) throw new RangeError('The root directory is over 16 KiB.');
  const words = gzipSync(JSON.stringify(metadata), { level: 9 });
  const zooms = sorted.map((tile) => tile.z);
  const header = packHeader({
    rootBytes: root.length,
    metadataBytes: words.length,
    tileBytes: end,
    counts: [sorted.length, entries.length, contents.length],
    zooms: [Math.min(...zooms), Math.max(...zooms)],
    box,
  });
  return Buffer.concat([header, root, words, ...contents]);
}

interface HeaderFacts {
  readonly rootBytes: number;
  readonly metadataBytes: number;
  readonly tileBytes: number;
  /** Tiles addressed, directory entries, contents kept. */
  readonly counts: readonly [number, number, number];
  readonly zooms: readonly [number, number];
  readonly box: Box;
}

/** Specification v3, §2 "Header": little-endian, positions in 1e-7 degrees. */
function packHeader({ rootBytes, metadataBytes, tileBytes, counts, zooms, box }: HeaderFacts): Buffer {
  const header = Buffer.alloc(HEADER_BYTES);
  header.write('PMTiles', 0, 'ascii');
  header.writeUInt8(3, 7);
  const metadataAt = HEADER_BYTES + rootBytes;
  const tilesAt = metadataAt + metadataBytes;
  // Root, metadata, leaf directories (none) and tile data, each as offset and length; then the three counts.
  const longs = [HEADER_BYTES, rootBytes, metadataAt, metadataBytes, tilesAt, 0, tilesAt, tileBytes, ...counts];
  longs.forEach((value, i) => header.writeBigUInt64LE(BigInt(value), 8 + 8 * i));
  const clustered = 1;
  [clustered, GZIP, GZIP, VECTOR_TILE, ...zooms].forEach((value, i) => header.writeUInt8(value, 96 + i));
  const e7 = (degrees: number) => Math.round(degrees * 1e7);
  [box.west, box.south, box.east, box.north].forEach((value, i) => header.writeInt32LE(e7(value), 102 + 4 * i));
  header.writeUInt8(zooms[0], 118);
  header.writeInt32LE(e7((box.west + box.east) / 2), 119);
  header.writeInt32LE(e7((box.south + box.north) / 2), 123);
  return header;
}
