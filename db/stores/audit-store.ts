import type { Knex } from 'knex';
import { toJsonb } from '@/db/json';

export interface AuditEvent {
  readonly userId: string | null;
  /** Kebab-case verb and noun: "save-boat-sheet". */
  readonly action: string;
  readonly subjectId?: string;
  /** Never secrets. */
  readonly details?: Readonly<Record<string, unknown>>;
}

export async function insertAuditEvent(db: Knex, event: AuditEvent): Promise<void> {
  await db('audit_events').insert({
    user_id: event.userId,
    action: event.action,
    subject_id: event.subjectId ?? null,
    details: toJsonb(event.details ?? {}) as Record<string, unknown>,
  });
}
