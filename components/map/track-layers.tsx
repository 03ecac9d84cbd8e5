import { Layer, Source } from 'react-map-gl/maplibre';
import type { ExpressionSpecification } from 'maplibre-gl';
import type { FeatureCollection } from 'geojson';
import { imageId } from './draw-image';
import { MAP_PALETTES, type MapTheme } from './map-palette';

/** The wide unseen lines that take a click or a tap on a leg. */
export const LEG_HIT_LAYERS = ['plan-hit', 'track-hit'];

interface Props {
  readonly theme: MapTheme;
  readonly corridors: FeatureCollection;
  readonly plan: FeatureCollection;
  readonly track: FeatureCollection;
}

const SELECTED: ExpressionSpecification = ['==', ['get', 'selected'], true];
const ROUND = { 'line-join': 'round', 'line-cap': 'round' } as const;
const BUTT = { 'line-join': 'round', 'line-cap': 'butt' } as const;

/**
 * Corridor, planned line and the way sailed. The leading end is in the pattern (A whole with ticks across, B in long
 * dashes), the state in what runs beside it: nothing, one rail, two rails, or rings on the line.
 */
export function TrackLayers({ theme, corridors, plan, track }: Props) {
  const palette = MAP_PALETTES[theme];
  const stateColour: ExpressionSpecification = [
    'match',
    ['get', 'state'],
    'within',
    palette.state.within,
    'thin',
    palette.state.thin,
    'beyond',
    palette.state.beyond,
    palette.state.unknown,
  ];
  const end = (letter: 'A' | 'B'): ExpressionSpecification => ['==', ['get', 'end'], letter];
  const state = (name: string): ExpressionSpecification => ['==', ['get', 'state'], name];
  const width: ExpressionSpecification = ['match', ['get', 'state'], 'beyond', 4.5, 'thin', 3.5, 'unknown', 2, 3];
  return (
    <>
      <Source id="corridors" type="geojson" data={corridors}>
        <Layer id="corridor-fill" type="fill" paint={{ 'fill-color': palette.spruce, 'fill-opacity': 0.05 }} />
        <Layer
          id="corridor-edge"
          type="line"
          paint={{ 'line-color': palette.spruce, 'line-opacity': 0.5, 'line-width': 0.75, 'line-dasharray': [2, 3] }}
        />
      </Source>
      <Source id="plan" type="geojson" data={plan}>
        <Layer
          id="plan-selected"
          type="line"
          filter={SELECTED}
          layout={ROUND}
          paint={{ 'line-color': palette.spruce, 'line-opacity': 0.28, 'line-width': 16 }}
        />
        <Layer
          id="plan-line"
          type="line"
          layout={ROUND}
          paint={{ 'line-color': palette.ink, 'line-width': 1.5, 'line-dasharray': [0.1, 3] }}
        />
        <Layer id="plan-hit" type="line" paint={{ 'line-color': palette.ink, 'line-opacity': 0, 'line-width': 22 }} />
      </Source>
      <Source id="track" type="geojson" data={track}>
        <Layer
          id="track-ground"
          type="line"
          layout={ROUND}
          paint={{ 'line-color': palette.water, 'line-opacity': 0.85, 'line-width': 8 }}
        />
        <Layer
          id="track-two-rails"
          type="line"
          filter={state('beyond')}
          layout={BUTT}
          paint={{ 'line-color': palette.state.beyond, 'line-width': 1.5, 'line-gap-width': 9 }}
        />
        <Layer
          id="track-one-rail"
          type="line"
          filter={state('thin')}
          layout={BUTT}
          paint={{ 'line-color': palette.state.thin, 'line-width': 1.5, 'line-offset': 5.5 }}
        />
        <Layer
          id="track-a"
          type="line"
          filter={end('A')}
          layout={BUTT}
          paint={{ 'line-color': stateColour, 'line-width': width }}
        />
        <Layer
          id="track-b"
          type="line"
          filter={end('B')}
          layout={BUTT}
          paint={{ 'line-color': stateColour, 'line-width': width, 'line-dasharray': [4, 2] }}
        />
        <Layer
          id="track-a-ticks"
          type="symbol"
          filter={end('A')}
          layout={{
            'symbol-placement': 'line',
            'symbol-spacing': 22,
            'icon-image': imageId(theme, 'end-a-tick'),
            'icon-allow-overlap': true,
            'icon-ignore-placement': true,
          }}
        />
        <Layer
          id="track-rings"
          type="symbol"
          filter={state('unknown')}
          layout={{
            'symbol-placement': 'line',
            'symbol-spacing': 34,
            'icon-image': imageId(theme, 'ring-unknown'),
            'icon-allow-overlap': true,
            'icon-ignore-placement': true,
          }}
        />
        <Layer id="track-hit" type="line" paint={{ 'line-color': palette.ink, 'line-opacity': 0, 'line-width': 22 }} />
      </Source>
    </>
  );
}
