'use client';

import 'maplibre-gl/dist/maplibre-gl.css';
import './passage-map.css';
import { useCallback, useEffect, useId, useMemo, useRef, useState } from 'react';
import {
  Map,
  type MapEvent,
  type MapLayerMouseEvent,
  type MapRef,
  NavigationControl,
  ScaleControl,
} from 'react-map-gl/maplibre';
import type { Metres } from '@/lib/units/quantities';
import { corridorFeatures } from './corridor-features';
import { InsertHandle } from './insert-handle';
import { MapCredit } from './map-credit';
import { MapLegend } from './map-legend';
import { MAP_PALETTES, type MapTheme } from './map-palette';
import { LAND_LAYER, mapStyle } from './map-style';
import type { MapLeg, MapPlace, MapReefCall, MapWaypoint } from './map-types';
import { markFeatures } from './mark-features';
import { MarkLayers } from './mark-layers';
import { LONG_STEP_M, STEP_M } from './nudge';
import { supplyImages } from './supply-images';
import { prepareMaplibre } from './prepare-maplibre';
import { planFeatures, stateFeatures, trackFeatures } from './track-features';
import { LEG_HIT_LAYERS, TrackLayers } from './track-layers';
import { useHandlePlaces } from './use-handle-places';
import { viewOf } from './view-of';
import { WaypointMarker } from './waypoint-marker';

export interface PassageMapProps {
  readonly waypoints: readonly MapWaypoint[];
  readonly legs: readonly MapLeg[];
  readonly shunts: readonly MapPlace[];
  readonly reefCalls: readonly MapReefCall[];
  readonly selectedLeg: number | null;
  readonly selectedWaypoint?: string | null;
  /** Room to each side of leg i; left out, no corridors are drawn. */
  readonly corridors?: readonly Metres[];
  readonly theme: MapTheme;
  readonly readOnly?: boolean;
  /** Brought into sight and ringed when it changes. */
  readonly focusPoint?: MapPlace | null;
  onAddWaypoint?(place: MapPlace): void;
  onMoveWaypoint?(id: string, place: MapPlace): void;
  onInsertWaypoint?(legIndex: number, place: MapPlace): void;
  onSelectLeg?(legIndex: number): void;
  onSelectWaypoint?(id: string): void;
}

const MAP_WORDS = {
  'Map.Title': 'Sample chart: arrow keys move it, plus and minus zoom',
  'ScaleControl.NauticalMiles': 'nmi',
};
const NO_CORRIDORS: readonly Metres[] = [];

/**
 * The passage on the sample chart. A click on the water adds a waypoint at the end, dragging one moves it, a leg's
 * handle inserts one, a click on a leg selects it. Everything drawn is also in the page's tables.
 */
export function PassageMap({
  waypoints,
  legs,
  shunts,
  reefCalls,
  selectedLeg,
  selectedWaypoint = null,
  corridors = NO_CORRIDORS,
  theme,
  readOnly = false,
  focusPoint = null,
  onAddWaypoint,
  onMoveWaypoint,
  onInsertWaypoint,
  onSelectLeg,
  onSelectWaypoint,
}: PassageMapProps) {
  const map = useRef<MapRef>(null);
  const helpId = useId();
  const [ready, setReady] = useState(false);
  const [view] = useState(() => viewOf(waypoints));
  const [zoom, setZoom] = useState(8);
  const [dragged, setDragged] = useState<MapWaypoint | null>(null);
  const style = useMemo(() => mapStyle(theme, window.location.origin), [theme]);
  const palette = MAP_PALETTES[theme];

  const shown = useMemo(
    () => waypoints.map((waypoint) => (waypoint.id === dragged?.id ? dragged : waypoint)),
    [waypoints, dragged],
  );
  const plan = useMemo(() => planFeatures(shown, selectedLeg), [shown, selectedLeg]);
  const rooms = useMemo(() => corridorFeatures(shown, corridors), [shown, corridors]);
  const track = useMemo(() => trackFeatures(legs, selectedLeg), [legs, selectedLeg]);
  const states = useMemo(() => stateFeatures(legs, waypoints), [legs, waypoints]);
  const marks = useMemo(() => markFeatures(shunts, reefCalls, legs, focusPoint), [shunts, reefCalls, legs, focusPoint]);
  const handles = useHandlePlaces(waypoints, zoom);

  useEffect(() => {
    if (!focusPoint || !map.current) return;
    const place: [number, number] = [focusPoint.lon, focusPoint.lat];
    // What is in sight stays where it is: a map that moves under every look cannot be read.
    if (!map.current.getBounds().contains(place)) map.current.easeTo({ center: place, duration: 400 });
  }, [focusPoint]);

  const attach = useCallback((created: MapRef | null) => {
    map.current = created;
    if (created) supplyImages(created.getMap());
  }, []);

  const onIdle = ({ target }: MapEvent) => {
    setZoom(target.getZoom());
    if (!ready && target.queryRenderedFeatures({ layers: [LAND_LAYER] }).length > 0) setReady(true);
  };

  const onClick = ({ originalEvent, target, features, lngLat }: MapLayerMouseEvent) => {
    // Buttons on the map answer for themselves.
    if (originalEvent.target !== target.getCanvas()) return;
    const leg = features?.[0]?.properties['leg'] as number | undefined;
    if (leg !== undefined) onSelectLeg?.(leg);
    else if (!readOnly) onAddWaypoint?.({ lat: lngLat.lat, lon: lngLat.lng });
  };

  return (
    <section
      className="passage-map"
      data-map-ready={ready}
      data-map-theme={theme}
      data-testid="passage-map"
      aria-label="Map of the passage. Everything drawn on it is also in the tables of waypoints and legs."
    >
      <Map
        ref={attach}
        mapLib={prepareMaplibre()}
        mapStyle={style}
        initialViewState={view}
        locale={MAP_WORDS}
        attributionControl={false}
        dragRotate={false}
        pitchWithRotate={false}
        touchPitch={false}
        doubleClickZoom={readOnly}
        minZoom={6}
        maxZoom={14}
        renderWorldCopies={false}
        interactiveLayerIds={ready ? LEG_HIT_LAYERS : []}
        cursor={readOnly ? 'grab' : 'crosshair'}
        onIdle={onIdle}
        onZoomEnd={({ target }) => setZoom(target.getZoom())}
        onClick={onClick}
      >
        <TrackLayers theme={theme} corridors={rooms} plan={plan} track={track} />
        <MarkLayers theme={theme} marks={marks} states={states} />
        {!readOnly &&
          handles.map(({ leg, place }) => (
            <InsertHandle
              key={`${leg}/${waypoints[leg]!.id}`}
              legNumber={leg + 1}
              place={place}
              onInsert={(at) => onInsertWaypoint?.(leg, at)}
            />
          ))}
        {shown.map((waypoint, i) => (
          <WaypointMarker
            key={waypoint.id}
            waypoint={waypoint}
            number={i + 1}
            selected={waypoint.id === selectedWaypoint}
            readOnly={readOnly}
            helpId={helpId}
            onDrag={(at) => setDragged(at && { ...waypoint, ...at })}
            onMove={(at) => onMoveWaypoint?.(waypoint.id, at)}
            onSelect={() => onSelectWaypoint?.(waypoint.id)}
          />
        ))}
        <NavigationControl position="top-right" showCompass={false} />
        <ScaleControl position="bottom-left" unit="nautical" maxWidth={120} />
      </Map>
      {!readOnly && waypoints.length === 0 && (
        <p className="map-hint">Click or tap the water where the passage starts.</p>
      )}
      <MapLegend palette={palette} />
      <MapCredit />
      <p id={helpId} hidden>
        Arrow keys move it by {STEP_M} m, with Shift by {LONG_STEP_M} m.
      </p>
    </section>
  );
}
