import path from 'node:path';
import { arrows, keepers } from './arrows.mjs';

/**
 * Whether `file` (a path from the project's root) may import `specifier`. Files outside the layers (tests,
 * scripts, settings) may import anything.
 *
 * @param {string} file
 * @param {string} specifier
 * @returns {{ allowed: boolean, from?: string, to: string }}
 */
export function mayImport(file, specifier) {
  const from = longest(Object.keys(arrows), file);
  const inside = specifier.startsWith('@/') || specifier.startsWith('.');
  const to = inside ? insideName(specifier, file) : specifier;
  if (from === undefined) return { allowed: true, to };
  return { allowed: inside ? mayReach(from, to) : mayLoad(from, to), from, to };
}

function insideName(specifier, file) {
  if (specifier.startsWith('@/')) return path.posix.normalize(specifier.slice(2));
  return path.posix.join(path.posix.dirname(file), specifier);
}

function mayReach(from, target) {
  const layer = longest(Object.keys(arrows), target);
  if (layer === undefined) return false;
  if (layer === from) return true;
  // 'components' stands for its sub-layers too; a sub-layer under lib is named by itself.
  return arrows[from].to.some((name) => name === layer || (name === 'components' && layer.startsWith('components/')));
}

function mayLoad(from, specifier) {
  const listed = arrows[from].packages ?? [];
  if (listed.some((name) => isOf(specifier, name))) return true;
  if (!listed.includes('*')) return false;
  const keeper = keepers.find(({ packages }) => packages.some((name) => isOf(specifier, name)));
  return !keeper || keeper.by.some((layer) => isOf(from, layer));
}

function isOf(name, parent) {
  return name === parent || name.startsWith(`${parent}/`);
}

/** The longest of `names` that `file` is or lies in; the extension does not count. */
function longest(names, file) {
  const bare = file.replace(/\.(ts|tsx|mjs|js)$/, '');
  return names.filter((name) => isOf(bare, name)).sort((a, b) => b.length - a.length)[0];
}
