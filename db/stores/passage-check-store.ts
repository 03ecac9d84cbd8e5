import type { Knex } from 'knex';
import type { CheckResult } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { toJsonb } from '@/db/json';

export interface NewPassageCheck {
  readonly passageId: string;
  readonly passageRevision: number;
  readonly boatSheetId: string;
  readonly forecastId: string;
  readonly asOf: Date;
  readonly inputs: PassagePlan;
  readonly result: CheckResult;
  readonly worstLegPosition: number | null;
  readonly checkedBy: string;
}

export async function insertPassageCheck(db: Knex, check: NewPassageCheck): Promise<{ id: string; createdAt: Date }> {
  const [row] = await db('passage_checks')
    .insert({
      passage_id: check.passageId,
      passage_revision: check.passageRevision,
      boat_sheet_id: check.boatSheetId,
      forecast_id: check.forecastId,
      engine_version: check.result.engineVersion,
      as_of: check.asOf,
      inputs: toJsonb(check.inputs) as never,
      result: toJsonb(check.result) as never,
      state: check.result.state,
      largest_load_share: check.result.totals.largestLoadShare,
      worst_leg_position: check.worstLegPosition,
      checked_by: check.checkedBy,
    })
    .returning(['id', 'created_at']);
  return { id: row!.id, createdAt: row!.created_at };
}
