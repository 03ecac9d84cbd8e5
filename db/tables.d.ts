import type { CheckResult, CheckState, Limits } from '@/lib/passages/passage';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import type { BoatRole } from '@/lib/access/permissions';

/** The tables as rows. Columns with a default are optional when inserting. */
export interface UserRow {
  id: string;
  email: string;
  name: string;
  /** Null until the person has chosen one by a mailed link. */
  password_hash: string | null;
  session_version: number;
  created_at: Date;
  updated_at: Date;
}
export interface PersonalTokenRow {
  id: string;
  user_id: string;
  name: string;
  token_hash: Buffer;
  created_at: Date;
  last_used_at: Date | null;
  revoked_at: Date | null;
}
export interface PasswordResetRow {
  id: string;
  user_id: string;
  token_hash: Buffer;
  created_at: Date;
  expires_at: Date;
  used_at: Date | null;
}
export interface AuditEventRow {
  id: string;
  at: Date;
  user_id: string | null;
  action: string;
  subject_id: string | null;
  details: Record<string, unknown>;
}
export interface BoatRow {
  id: string;
  name: string;
  created_at: Date;
  updated_at: Date;
  hidden_at: Date | null;
  hidden_by: string | null;
}
export interface BoatMemberRow {
  boat_id: string;
  user_id: string;
  role: BoatRole;
  created_at: Date;
}
export interface BoatSheetRow {
  id: string;
  boat_id: string;
  number: number;
  schema_version: number;
  sheet: BoatSheet;
  saved_by: string;
  created_at: Date;
}
export interface PassageRow {
  id: string;
  boat_id: string;
  name: string;
  zone: string;
  departure: Date;
  limits: Limits;
  revision: number;
  created_by: string;
  created_at: Date;
  updated_at: Date;
  hidden_at: Date | null;
  hidden_by: string | null;
}
export interface WaypointRow {
  passage_id: string;
  position: number;
  name: string;
  lat: number;
  lon: number;
  corridor_half_width_m: number;
}
export interface ForecastRow {
  id: string;
  passage_id: string;
  number: number;
  kind: 'typed';
  source: string;
  issued_at: Date;
  rows: PassagePlan['wind']['rows'];
  entered_by: string;
  created_at: Date;
}
export interface PassageStreamRow {
  passage_id: string;
  rows: PassagePlan['streamRows'];
}
export interface PassageCheckRow {
  id: string;
  passage_id: string;
  passage_revision: number;
  boat_sheet_id: string;
  forecast_id: string;
  engine_version: string;
  as_of: Date;
  inputs: PassagePlan;
  result: CheckResult;
  state: CheckState;
  largest_load_share: number | null;
  worst_leg_position: number | null;
  checked_by: string;
  created_at: Date;
}

declare module 'knex/types/tables.js' {
  interface Tables {
    users: UserRow;
    personal_tokens: PersonalTokenRow;
    password_resets: PasswordResetRow;
    audit_events: AuditEventRow;
    boats: BoatRow;
    boat_members: BoatMemberRow;
    boat_sheets: BoatSheetRow;
    passages: PassageRow;
    waypoints: WaypointRow;
    forecasts: ForecastRow;
    passage_streams: PassageStreamRow;
    passage_checks: PassageCheckRow;
  }
}
