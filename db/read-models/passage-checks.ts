import type { Knex } from 'knex';
import type { CheckResult, CheckState } from '@/lib/passages/passage';

export interface StoredCheckLine {
  readonly id: string;
  readonly passageRevision: number;
  readonly sheetNumber: number;
  readonly engineVersion: string;
  readonly asOf: Date;
  readonly state: CheckState;
  readonly largestLoadShare: number | null;
  readonly worstLegPosition: number | null;
  readonly checkedAt: Date;
  readonly checkedBy: string;
}

export interface StoredCheck extends StoredCheckLine {
  readonly result: CheckResult;
}

const columns = [
  'passage_checks.id',
  'passage_checks.passage_revision',
  'passage_checks.engine_version',
  'passage_checks.as_of',
  'passage_checks.state',
  'passage_checks.largest_load_share',
  'passage_checks.worst_leg_position',
  'passage_checks.created_at',
  'boat_sheets.number as sheet_number',
  'users.name as checked_by_name',
] as const;

/** The checks that were stored of a passage, newest first, without their legs. */
export async function listPassageChecks(db: Knex, passageId: string): Promise<readonly StoredCheckLine[]> {
  const rows = await newestFirst(db, passageId).select(...columns);
  return rows.map(toLine);
}

export async function findLatestCheck(db: Knex, passageId: string): Promise<StoredCheck | null> {
  const row = await newestFirst(db, passageId).first(...columns, 'passage_checks.result');
  return row ? { ...toLine(row), result: row.result } : null;
}

function newestFirst(db: Knex, passageId: string) {
  return db('passage_checks')
    .join('boat_sheets', 'boat_sheets.id', 'passage_checks.boat_sheet_id')
    .join('users', 'users.id', 'passage_checks.checked_by')
    .where('passage_checks.passage_id', passageId)
    .orderBy([
      { column: 'passage_checks.passage_revision', order: 'desc' },
      { column: 'passage_checks.created_at', order: 'desc' },
    ]);
}

interface Row {
  id: string;
  passage_revision: number;
  engine_version: string;
  as_of: Date;
  state: CheckState;
  largest_load_share: number | null;
  worst_leg_position: number | null;
  created_at: Date;
  sheet_number: number;
  checked_by_name: string;
}

function toLine(row: Row): StoredCheckLine {
  return {
    id: row.id,
    passageRevision: row.passage_revision,
    sheetNumber: row.sheet_number,
    engineVersion: row.engine_version,
    asOf: row.as_of,
    state: row.state,
    largestLoadShare: row.largest_load_share,
    worstLegPosition: row.worst_leg_position,
    checkedAt: row.created_at,
    checkedBy: row.checked_by_name,
  };
}
