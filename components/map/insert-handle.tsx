import { useRef } from 'react';
import { Marker } from 'react-map-gl/maplibre';
import type { MapPlace } from './map-types';

interface Props {
  /** Number of the leg as the reader counts: 1 is the first. */
  readonly legNumber: number;
  readonly place: MapPlace;
  onInsert(place: MapPlace): void;
}

/** The handle in the middle of a leg: a tap puts a waypoint there, a drag puts it where it is let go. */
export function InsertHandle({ legNumber, place, onInsert }: Props) {
  const dragged = useRef(false);
  return (
    <Marker
      longitude={place.lon}
      latitude={place.lat}
      anchor="center"
      draggable
      clickTolerance={4}
      onDragStart={() => {
        dragged.current = true;
      }}
      onDragEnd={({ lngLat, target }) => {
        target.setLngLat([place.lon, place.lat]);
        onInsert({ lat: lngLat.lat, lon: lngLat.lng });
      }}
    >
      <button
        type="button"
        className="insert-handle"
        data-testid={`map-insert-${legNumber}`}
        aria-label={`Insert a waypoint in leg ${legNumber}`}
        onPointerDown={() => {
          dragged.current = false;
        }}
        onClick={() => {
          // A drag ends with a click of its own on some devices; a key press comes without a pointer.
          if (!dragged.current) onInsert(place);
          dragged.current = false;
        }}
      >
        <svg viewBox="0 0 24 24" width="24" height="24" aria-hidden="true">
          <path d="M12 5.5L18.5 12L12 18.5L5.5 12Z" className="insert-handle-ground" />
          <path d="M12 9V15M9 12H15" className="insert-handle-cross" />
        </svg>
      </button>
    </Marker>
  );
}
