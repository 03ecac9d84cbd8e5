import { z } from 'zod';
import { boatNameField, boatSheetSchema } from '@/lib/schemas/boat-sheet';

/** Body of POST /api/boats. */
export const newBoatSchema = z.object({ name: boatNameField, sheet: boatSheetSchema });

/** Body of POST /api/boats/{boatId}/sheets. */
export const newBoatSheetSchema = z.object({
  sheet: boatSheetSchema,
  basedOnNumber: z
    .number({ error: 'basedOnNumber: give the number of the version that yours is based on.' })
    .int({ error: 'basedOnNumber: give a whole number.' })
    .min(1)
    .max(1_000_000),
});

/** Body of PATCH /api/boats/{boatId}. */
export const boatRenameSchema = z.object({ name: boatNameField });
