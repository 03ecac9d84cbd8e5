import type { ExpressionSpecification, SymbolLayerSpecification } from 'maplibre-gl';
import { imageId } from './draw-image';
import { REGULAR } from './fonts';
import type { MapPalette, MapTheme } from './map-palette';

/** Lesser names come nearer. */
const RANK_SHOWN: ExpressionSpecification = ['step', ['zoom'], 1, 9, 2, 10, 3];

function names(
  kind: string,
  source: string,
  layout: SymbolLayerSpecification['layout'],
  paint: SymbolLayerSpecification['paint'],
): SymbolLayerSpecification {
  return {
    id: `place-${kind}`,
    type: 'symbol',
    source,
    'source-layer': 'places',
    minzoom: 7,
    filter: ['all', ['==', ['get', 'kind'], kind], ['<=', ['get', 'rank'], RANK_SHOWN]],
    layout: {
      'text-field': ['get', 'name'],
      'text-font': [REGULAR],
      'text-max-width': 7,
      'symbol-sort-key': ['get', 'rank'],
      ...layout,
    },
    paint,
  };
}

/** Names of waters, lands and towns. */
export function placeLayers(theme: MapTheme, palette: MapPalette, source: string): SymbolLayerSpecification[] {
  const onLand = { 'text-color': palette.landText, 'text-halo-color': palette.land, 'text-halo-width': 1.5 };
  return [
    names('mainland', source, { 'text-size': 13, 'text-letter-spacing': 0.16, 'text-max-width': 12 }, onLand),
    names(
      'water',
      source,
      { 'text-size': ['interpolate', ['linear'], ['zoom'], 7, 11, 12, 15], 'text-letter-spacing': 0.14 },
      { 'text-color': palette.waterText, 'text-halo-color': palette.water, 'text-halo-width': 1.5 },
    ),
    names('island', source, { 'text-size': ['interpolate', ['linear'], ['zoom'], 8, 11, 12, 14] }, onLand),
    names(
      'town',
      source,
      {
        'icon-image': imageId(theme, 'town'),
        'icon-allow-overlap': true,
        'text-optional': true,
        'text-size': 11.5,
        'text-variable-anchor': ['left', 'right', 'top', 'bottom'],
        'text-radial-offset': 0.6,
        'text-justify': 'auto',
      },
      onLand,
    ),
  ];
}
