import { z } from 'zod';
import { limitsSchema, routeSchema, streamRowsSchema, windRowsSchema } from '@/lib/schemas/check-request';
import { instantField, nameField } from '@/lib/schemas/number-field';

/** What the planner saves. Instants are UTC; `zone` (IANA) is the one the passage is shown in. */
export const passagePlanSchema = z.object({
  name: nameField('Passage name', 120),
  zone: nameField('Time zone', 64).refine(isKnownZone, {
    error: 'Time zone: give a name of the IANA list, for example America/Vancouver.',
  }),
  departure: instantField('Departure'),
  route: routeSchema,
  wind: z.object({
    source: nameField('Source of the wind', 200),
    issuedAt: instantField('Issue time of the forecast'),
    rows: windRowsSchema,
  }),
  /** Empty: no stream was entered, and the check says so. */
  streamRows: streamRowsSchema.default([]),
  limits: limitsSchema.default({}),
});

export type PassagePlan = z.output<typeof passagePlanSchema>;
export type PassagePlanInput = z.input<typeof passagePlanSchema>;

function isKnownZone(zone: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}
