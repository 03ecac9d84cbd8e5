import { rhumbDirect } from '@/lib/geo/rhumb';
import type { Metres, TrueDegrees } from '@/lib/units/quantities';
import type { MapPlace } from './map-types';

const COURSES: Readonly<Record<string, TrueDegrees>> = { ArrowUp: 0, ArrowRight: 90, ArrowDown: 180, ArrowLeft: 270 };
export const STEP_M: Metres = 50;
export const LONG_STEP_M: Metres = 500;

/** Where an arrow key takes a waypoint; null for any other key. */
export function nudge(place: MapPlace, key: string, long: boolean): MapPlace | null {
  const course = COURSES[key];
  return course === undefined ? null : rhumbDirect(place, course, long ? LONG_STEP_M : STEP_M);
}
