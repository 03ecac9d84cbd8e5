import type { StyleSpecification } from 'maplibre-gl';

export const REGULAR = 'Noto Sans Regular';
/** What each file covers, as the makers of @fontsource/noto-sans cut it. */
const COVERS = {
  latin: ['U+0000-00FF', 'U+0131', 'U+0152-0153', 'U+02BB-02BC', 'U+02C6', 'U+02DA', 'U+02DC', 'U+2000-206F', 'U+2212'],
  'latin-ext': ['U+0100-02BA', 'U+02BD-02C5', 'U+02C7-02CC', 'U+1E00-1E9F', 'U+1EF2-1EFF'],
};

/** The map's letters, from files of our own. */
export function fontFaces(origin: string): NonNullable<StyleSpecification['font-faces']> {
  return {
    [REGULAR]: Object.entries(COVERS).map(([subset, range]) => ({
      url: `${origin}/fonts/noto-sans-${subset}-400.woff2`,
      'unicode-range': range,
    })),
  };
}
