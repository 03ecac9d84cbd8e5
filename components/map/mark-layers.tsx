import { Layer, Source } from 'react-map-gl/maplibre';
import type { FeatureCollection } from 'geojson';
import { MAP_PALETTES, type MapTheme } from './map-palette';
import { REGULAR } from './fonts';

interface Props {
  readonly theme: MapTheme;
  readonly marks: FeatureCollection;
  readonly states: FeatureCollection;
}

/** Shunts, reef calls, flags and the state of each leg. All of them are drawn: none gives way to another. */
export function MarkLayers({ theme, marks, states }: Props) {
  const palette = MAP_PALETTES[theme];
  return (
    <>
      <Source id="marks" type="geojson" data={marks}>
        <Layer
          id="marks"
          type="symbol"
          layout={{
            'icon-image': ['concat', `${theme}/`, ['get', 'mark']],
            'icon-allow-overlap': true,
            'icon-ignore-placement': true,
            'text-field': ['get', 'label'],
            'text-font': [REGULAR],
            'text-size': 12,
            'text-anchor': 'left',
            'text-offset': [1.1, 0],
            'text-max-width': 12,
            'text-justify': 'left',
            'text-optional': true,
          }}
          paint={{ 'text-color': palette.ink, 'text-halo-color': palette.paper, 'text-halo-width': 2 }}
        />
      </Source>
      <Source id="states" type="geojson" data={states}>
        <Layer
          id="states"
          type="symbol"
          layout={{
            'icon-image': ['concat', `${theme}/state-`, ['get', 'state']],
            'icon-allow-overlap': true,
            'icon-ignore-placement': true,
          }}
        />
      </Source>
    </>
  );
}
