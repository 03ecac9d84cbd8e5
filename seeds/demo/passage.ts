import type { PassagePlanInput } from '@/lib/schemas/passage-plan';
import { SAMPLE_ZONE, sampleDeparture, sampleForecast } from '@/lib/usecases/demo/sample-forecast';

export const demoPassageName = 'Round the west side';

/** An invented passage in open water west and north of the San Juan Islands. Not for navigation. */
const route: PassagePlanInput['route'] = [
  { name: 'Off Iceberg Point', lat: 48.405, lon: -122.93, corridorHalfWidthM: 600 },
  { name: 'Salmon Bank', lat: 48.425, lon: -123.03, corridorHalfWidthM: 800 },
  { name: 'Off Pile Point', lat: 48.475, lon: -123.135, corridorHalfWidthM: 600 },
  { name: 'Mid Haro Strait', lat: 48.575, lon: -123.215, corridorHalfWidthM: 800 },
  { name: 'Off Turn Point', lat: 48.7, lon: -123.26, corridorHalfWidthM: 500 },
  { name: 'Boundary Pass', lat: 48.745, lon: -123.07, corridorHalfWidthM: 800 },
  { name: 'North of Orcas', lat: 48.738, lon: -122.96, corridorHalfWidthM: 500 },
];

/** The passage as it is saved on the day the demo is made. */
export function demoPassagePlan(now: Date): PassagePlanInput {
  return {
    name: demoPassageName,
    zone: SAMPLE_ZONE,
    departure: sampleDeparture(now).toISOString(),
    route,
    wind: sampleForecast(now),
    streamRows: [],
    limits: { gustKn: 28, loadShare: 0.8, afterDark: false },
  };
}
