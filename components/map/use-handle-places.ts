import { useMemo } from 'react';
import { alongRhumb } from '@/lib/geo/along-rhumb';
import { rhumbInverse } from '@/lib/geo/rhumb';
import type { MapPlace } from './map-types';

/** Nearer together than this on the screen, two waypoints leave no room for a handle a finger can hit. */
const ROOM_PX = 110;
/** Metres a pixel at zoom 0 on the equator: the earth's girth over a tile of 512. */
const METRES_PER_PX = 40_075_017 / 512;

/** Where the legs' insert handles stand at a zoom; legs too short on the screen have none. */
export function useHandlePlaces(
  waypoints: readonly MapPlace[],
  zoom: number,
): readonly { readonly leg: number; readonly place: MapPlace }[] {
  return useMemo(
    () =>
      waypoints.slice(1).flatMap((to, leg) => {
        const from = waypoints[leg]!;
        const metresPerPx = (METRES_PER_PX * Math.cos((from.lat * Math.PI) / 180)) / 2 ** zoom;
        const lengthPx = rhumbInverse(from, to).distanceM / metresPerPx;
        return lengthPx < ROOM_PX ? [] : [{ leg, place: alongRhumb(from, to, 0.5) }];
      }),
    [waypoints, zoom],
  );
}
