// Exit code 0 where node_modules is missing or is not what package-lock.json names; 1 where all is there.
import { readFileSync } from 'node:fs';

function packagesOf(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8')).packages;
  } catch {
    return {};
  }
}

const wanted = Object.entries(packagesOf('package-lock.json')).filter(([path]) => path !== '');
const installed = packagesOf('node_modules/.package-lock.json');
// Optional packages are often for another machine.
const differ = wanted.some(([path, { version, optional }]) => {
  const here = installed[path]?.version;
  return here === undefined ? !optional : here !== version;
});

process.exit(differ ? 0 : 1);
