import type { CheckResult } from '@/lib/passages/passage';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import type { EpochMs } from '@/lib/units/quantities';

/** What goes to the check worker and what comes back; `id` tells which question an answer belongs to. */
export interface CheckQuestion {
  readonly id: number;
  readonly plan: PassagePlan;
  readonly sheet: BoatSheet;
  /** When the forecast's age is judged. */
  readonly asOf: EpochMs;
}

export type CheckAnswer =
  | { readonly id: number; readonly ok: true; readonly result: CheckResult }
  | { readonly id: number; readonly ok: false; readonly message: string };
