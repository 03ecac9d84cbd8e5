import { copyFile, mkdir } from 'node:fs/promises';
import path from 'node:path';

const PACKAGE_DIR = path.join(import.meta.dirname, '../../node_modules/@fontsource/noto-sans');
const SUBSETS = ['latin', 'latin-ext'];
const WEIGHTS = [400, 700];

/** Copies Noto Sans, as page and map use it, with its licence. */
export async function copyFonts(targetDir: string): Promise<void> {
  await mkdir(targetDir, { recursive: true });
  for (const subset of SUBSETS) {
    for (const weight of WEIGHTS) {
      const source = path.join(PACKAGE_DIR, 'files', `noto-sans-${subset}-${weight}-normal.woff2`);
      await copyFile(source, path.join(targetDir, `noto-sans-${subset}-${weight}.woff2`));
    }
  }
  await copyFile(path.join(PACKAGE_DIR, 'LICENSE'), path.join(targetDir, 'OFL.txt'));
}
