import type { KeyboardEvent } from 'react';
import { Marker } from 'react-map-gl/maplibre';
import type { MapPlace, MapWaypoint } from './map-types';
import { nudge } from './nudge';

interface Props {
  readonly waypoint: MapWaypoint;
  readonly number: number;
  readonly selected: boolean;
  readonly readOnly: boolean;
  readonly helpId: string;
  onDrag(place: MapPlace | null): void;
  onMove(place: MapPlace): void;
  onSelect(): void;
}

/** A waypoint as a button that is dragged by mouse or finger and moved by the arrow keys. */
export function WaypointMarker({ waypoint, number, selected, readOnly, helpId, onDrag, onMove, onSelect }: Props) {
  const { lat, lon, name } = waypoint;
  const onKeyDown = (event: KeyboardEvent) => {
    if (readOnly || event.altKey || event.ctrlKey || event.metaKey) return;
    const moved = nudge(waypoint, event.key, event.shiftKey);
    if (!moved) return;
    // The map under it would pan.
    event.preventDefault();
    event.stopPropagation();
    onMove(moved);
  };
  return (
    <Marker
      longitude={lon}
      latitude={lat}
      anchor="center"
      draggable={!readOnly}
      clickTolerance={4}
      className={selected ? 'waypoint-holder waypoint-holder-selected' : 'waypoint-holder'}
      onDrag={({ lngLat }) => onDrag({ lat: lngLat.lat, lon: lngLat.lng })}
      onDragEnd={({ lngLat }) => {
        onDrag(null);
        onMove({ lat: lngLat.lat, lon: lngLat.lng });
      }}
    >
      <button
        type="button"
        className={selected ? 'waypoint waypoint-selected' : 'waypoint'}
        data-testid={`map-waypoint-${number}`}
        aria-label={`Waypoint ${number}${name ? `, ${name}` : ''}`}
        aria-describedby={readOnly ? undefined : helpId}
        onKeyDown={onKeyDown}
        onClick={onSelect}
      >
        <span className="waypoint-number">{number}</span>
        {name && <span className="waypoint-name">{name}</span>}
      </button>
    </Marker>
  );
}
