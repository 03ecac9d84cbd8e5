import { type PassagePlan, type PassagePlanInput, passagePlanSchema } from '@/lib/schemas/passage-plan';

/** Two legs in open water with a steady westerly, departing an hour after `testNow`. */
export function aPassagePlan(changes: Partial<PassagePlanInput> = {}): PassagePlan {
  return passagePlanSchema.parse({
    name: 'Across the bay',
    zone: 'America/Los_Angeles',
    departure: '2026-06-01T13:00:00Z',
    route: [
      { name: 'Start', lat: 48, lon: -125, corridorHalfWidthM: 1000 },
      { name: 'Middle', lat: 48.1, lon: -125, corridorHalfWidthM: 1000 },
      { name: 'End', lat: 48.2, lon: -125.02, corridorHalfWidthM: 1000 },
    ],
    wind: {
      source: 'Typed from the radio',
      issuedAt: '2026-06-01T10:00:00Z',
      rows: [
        { time: '2026-06-01T12:00:00Z', fromDeg: 270, meanKn: 8, gustKn: 10 },
        { time: '2026-06-02T06:00:00Z', fromDeg: 270, meanKn: 8, gustKn: 10 },
      ],
    },
    streamRows: [],
    limits: { gustKn: 25 },
    ...changes,
  });
}
