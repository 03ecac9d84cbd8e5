import { z } from 'zod';
import { passagePlanSchema } from '@/lib/schemas/passage-plan';

/** Body of POST /api/passages. */
export const newPassageSchema = z.object({
  boatId: z.uuid({ error: 'boatId: give the id of one of your boats.' }),
  name: passagePlanSchema.shape.name,
  zone: passagePlanSchema.shape.zone.default('UTC'),
});

/** Body of PUT /api/passages/{passageId}. */
export const passageSaveSchema = z.object({
  plan: passagePlanSchema,
  basedOnRevision: z
    .number({ error: 'basedOnRevision: give the revision that your plan is based on.' })
    .int({ error: 'basedOnRevision: give a whole number.' })
    .min(1)
    .max(1_000_000_000),
});
