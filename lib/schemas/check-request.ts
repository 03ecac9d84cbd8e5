import { z } from 'zod';
import { boatSchema } from '@/lib/schemas/boat';
import { instantField, nameField, numberField } from '@/lib/schemas/number-field';
import {
  findRouteContradictions,
  findStreamContradictions,
  findWindContradictions,
} from '@/lib/schemas/route-contradictions';

export const latField = numberField({
  what: 'Latitude',
  unit: '°',
  min: -85,
  max: 85,
  hintOver: 'Degrees north, negative to the south; charts here end at 85°.',
});
export const lonField = numberField({
  what: 'Longitude',
  unit: '°',
  min: -180,
  max: 180,
  hintOver: 'Degrees east, negative to the west: 190° east is written −170.',
});

export const waypointSchema = z.object({
  name: nameField('Waypoint name'),
  lat: latField,
  lon: lonField,
  corridorHalfWidthM: numberField({ what: 'Corridor half-width', unit: 'm', min: 10, max: 50_000 }).default(1000),
});

export const routeSchema = z
  .array(waypointSchema)
  .min(2, { error: 'Route: give at least two waypoints.' })
  .max(200, { error: 'Route: at most 200 waypoints.' })
  .superRefine(findRouteContradictions);

export const windRowSchema = z.object({
  time: instantField('Wind row'),
  fromDeg: numberField({ what: 'Wind from', unit: '° true', min: 0, max: 360 }),
  meanKn: numberField({ what: 'Mean wind', unit: 'kn', min: 0, max: 120 }),
  gustKn: numberField({ what: 'Gust', unit: 'kn', min: 0, max: 160 }).optional(),
});

export const windRowsSchema = z
  .array(windRowSchema)
  .min(1, { error: 'Wind: give at least one row; steady wind needs two.' })
  .max(5000, { error: 'Wind: at most 5,000 rows.' })
  .superRefine(findWindContradictions);

export const streamRowSchema = z.object({
  time: instantField('Stream row'),
  towardDeg: numberField({ what: 'Stream toward', unit: '° true', min: 0, max: 360 }),
  kn: numberField({ what: 'Stream', unit: 'kn', min: 0, max: 16 }),
});

export const streamRowsSchema = z
  .array(streamRowSchema)
  .max(5000, { error: 'Stream: at most 5,000 rows.' })
  .superRefine(findStreamContradictions);

export const windSchema = z.discriminatedUnion(
  'kind',
  [
    z.object({
      kind: z.literal('series'),
      issuedAt: instantField('Forecast issue time').optional(),
      rows: windRowsSchema,
    }),
  ],
  { error: 'Wind: kind must be "series".' },
);

export const streamSchema = z.discriminatedUnion(
  'kind',
  [
    z.object({ kind: z.literal('none') }),
    z.object({
      kind: z.literal('series'),
      rows: streamRowsSchema.min(1, { error: 'Stream: give at least one row, or say there is none.' }),
    }),
  ],
  { error: 'Stream: kind must be "none" or "series".' },
);

export const limitsSchema = z.object({
  meanKn: numberField({ what: 'Limit of the mean wind', unit: 'kn', min: 1, max: 80 }).optional(),
  gustKn: numberField({ what: 'Limit of the gust', unit: 'kn', min: 1, max: 100 }).optional(),
  loadShare: numberField({ what: 'Limit of the load share', unit: '', min: 0.05, max: 1 }).optional(),
  shuntsPerHour: numberField({ what: 'Limit of shunts an hour', unit: '', min: 0, max: 60 }).optional(),
  hours: numberField({ what: 'Limit of hours', unit: 'h', min: 0.25, max: 240 }).optional(),
  afterDark: z.boolean({ error: 'After dark: true or false.' }).optional(),
});

/** The body of POST /api/check. */
export const checkRequestSchema = z.object({
  boat: boatSchema,
  route: routeSchema,
  wind: windSchema,
  stream: streamSchema.default({ kind: 'none' }),
  departure: instantField('Departure'),
  asOf: instantField('asOf').optional(),
  limits: limitsSchema.optional(),
});

export type CheckRequest = z.output<typeof checkRequestSchema>;
export type CheckRequestInput = z.input<typeof checkRequestSchema>;
