/** Makes public/tiles-sample and public/fonts anew: `node --import tsx scripts/tiles.ts`. */
import { copyFile, mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { buildSample } from './tiles/build-sample';
import { copyFonts } from './tiles/copy-fonts';
import { SOURCE_DIR } from './tiles/region';

const publicDir = path.join(import.meta.dirname, '../public');
const tilesDir = path.join(publicDir, 'tiles-sample');

await mkdir(tilesDir, { recursive: true });
const { pmtiles, land } = await buildSample();
await writeFile(path.join(tilesDir, 'san-juan.pmtiles'), pmtiles);
await writeFile(path.join(tilesDir, 'land.json'), land);
await copyFile(path.join(SOURCE_DIR, 'LICENCE-land.txt'), path.join(tilesDir, 'LICENCE-land.txt'));
await copyFonts(path.join(publicDir, 'fonts'));
console.log(`san-juan.pmtiles ${pmtiles.length} bytes, land.json ${land.length} bytes, fonts copied`);
