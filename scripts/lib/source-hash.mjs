// Prints a hash of all that a build is made of: the sources, the settings, the lock file, the Node.js version.
import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';

const aside = new Set([
  '.git',
  '.ci',
  'node_modules',
  '.local',
  'tests',
  'docs',
  'coverage',
  'migrations',
  'seeds',
  'scripts',
]);

function isAside(name, folder) {
  if (folder === '.' && (aside.has(name) || name.startsWith('.next') || name.endsWith('.md'))) return true;
  return name === 'maplibre-gl-worker.mjs' || name === 'next-env.d.ts' || name.endsWith('.tsbuildinfo');
}

function* filesOf(folder) {
  const entries = readdirSync(folder, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1));
  for (const entry of entries) {
    if (isAside(entry.name, folder)) continue;
    const file = path.join(folder, entry.name);
    if (entry.isDirectory()) yield* filesOf(file);
    else if (entry.isFile()) yield file;
  }
}

const hash = createHash('sha256').update(process.version);
for (const file of filesOf('.')) hash.update(`\0${file}\0`).update(readFileSync(file));
process.stdout.write(`${hash.digest('hex')}\n`);
