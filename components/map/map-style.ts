import type { ExpressionSpecification, LayerSpecification, StyleSpecification } from 'maplibre-gl';
import { imageId } from './draw-image';
import { REGULAR, fontFaces } from './fonts';
import { MAP_PALETTES, type MapPalette, type MapTheme } from './map-palette';
import { placeLayers } from './place-layers';

const SAMPLE_SOURCE = 'sample';
/** The base layer whose features tell that the map is drawn. */
export const LAND_LAYER = 'land';

const on = (layer: string) => ({ source: SAMPLE_SOURCE, 'source-layer': layer });

/** Paper, water's wash and engraved rule, land, shore. The land hides the inner half of the wash. */
function groundLayers(theme: MapTheme, palette: MapPalette): LayerSpecification[] {
  const byZoom = (far: number, near: number): ExpressionSpecification => [
    'interpolate',
    ['linear'],
    ['zoom'],
    7,
    far,
    12,
    near,
  ];
  const round = { 'line-join': 'round', 'line-cap': 'round' } as const;
  return [
    { id: 'beyond', type: 'background', paint: { 'background-pattern': imageId(theme, 'beyond-rule') } },
    { id: 'water', type: 'fill', ...on('sheet'), paint: { 'fill-color': palette.water } },
    {
      id: 'shore-rule',
      type: 'line',
      ...on('shore'),
      layout: round,
      paint: { 'line-color': palette.shoreRule, 'line-width': byZoom(5, 26) },
    },
    {
      id: 'shore-wash',
      type: 'line',
      ...on('shore'),
      layout: round,
      paint: { 'line-color': palette.shoreWash, 'line-width': byZoom(3.5, 24) },
    },
    {
      id: LAND_LAYER,
      type: 'fill',
      ...on('land'),
      paint: { 'fill-pattern': imageId(theme, 'land-hatch'), 'fill-antialias': false },
    },
    {
      id: 'shore',
      type: 'line',
      ...on('shore'),
      layout: round,
      paint: { 'line-color': palette.shore, 'line-width': byZoom(0.6, 1.4) },
    },
    {
      id: 'frame-rule',
      type: 'line',
      ...on('frame'),
      layout: { 'line-join': 'miter', 'line-cap': 'square' },
      paint: { 'line-color': palette.shore, 'line-width': 1, 'line-gap-width': 5 },
    },
    {
      id: 'frame-words',
      type: 'symbol',
      ...on('frame'),
      layout: {
        'symbol-placement': 'line',
        'symbol-spacing': 420,
        'text-field': ['get', 'name'],
        'text-font': [REGULAR],
        'text-size': 11.5,
        'text-letter-spacing': 0.06,
        'text-offset': [0, -1.3],
        'text-keep-upright': true,
      },
      paint: { 'text-color': palette.landText, 'text-halo-color': palette.beyondSheet, 'text-halo-width': 2 },
    },
  ];
}

/** The map's own look, by day or by night. Everything it fetches comes from the page's origin. */
export function mapStyle(theme: MapTheme, origin: string): StyleSpecification {
  const palette = MAP_PALETTES[theme];
  return {
    version: 8,
    'font-faces': fontFaces(origin),
    sources: { [SAMPLE_SOURCE]: { type: 'vector', url: `pmtiles://${origin}/tiles-sample/san-juan.pmtiles` } },
    layers: [...groundLayers(theme, palette), ...placeLayers(theme, palette, SAMPLE_SOURCE)],
  };
}
