/** A run of tiles that share one content: `runLength` tiles from `id` on. */
export interface DirectoryEntry {
  readonly id: number;
  readonly runLength: number;
  readonly offset: number;
  readonly length: number;
}

/** LEB128: seven bits a byte, lowest first, the top bit set on all but the last. */
function varint(value: number): number[] {
  const bytes: number[] = [];
  let rest = value;
  while (rest >= 0x80) {
    bytes.push((rest % 0x80) | 0x80);
    rest = Math.floor(rest / 0x80);
  }
  return [...bytes, rest];
}

/** A PMTiles v3 directory before compression: the columns one after the other. Specification v3, §4 "Directories". */
export function packDirectory(entries: readonly DirectoryEntry[]): Buffer {
  const bytes = varint(entries.length);
  entries.forEach((entry, i) => bytes.push(...varint(entry.id - (entries[i - 1]?.id ?? 0))));
  entries.forEach((entry) => bytes.push(...varint(entry.runLength)));
  entries.forEach((entry) => bytes.push(...varint(entry.length)));
  entries.forEach((entry, i) => {
    const before = entries[i - 1];
    const follows = before !== undefined && entry.offset === before.offset + before.length;
    bytes.push(...varint(follows ? 0 : entry.offset + 1));
  });
  return Buffer.from(bytes);
}
