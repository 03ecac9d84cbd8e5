import { z } from 'zod';
import { boatFields, massSchema } from '@/lib/schemas/boat';
import { findBoatContradictions } from '@/lib/schemas/boat-contradictions';
import { isStorable, nameField } from '@/lib/schemas/number-field';

export const massKinds = ['structure', 'rig', 'stores', 'crew', 'ballast'] as const;
export type MassKind = (typeof massKinds)[number];

/** One version of everything recorded of the boat: what POST /api/check calls `boat`, with the owner's words. */
export const boatSheetSchema = z
  .object({
    ...boatFields,
    masses: z
      .array(massSchema.extend({ kind: z.enum(massKinds, { error: 'Kind: choose one of the list.' }) }))
      .min(1, { error: 'Masses: give at least one item.' })
      .max(200),
    notes: z
      .string()
      .max(4000, { error: 'Notes: at most 4,000 characters.' })
      .refine(isStorable, { error: 'Notes: they hold characters that cannot be shown. Type them again.' })
      .default(''),
  })
  .superRefine(findBoatContradictions);

export type BoatSheet = z.output<typeof boatSheetSchema>;
export type BoatSheetInput = z.input<typeof boatSheetSchema>;

export const boatNameField = nameField('Boat name', 60);
