import { isDeepStrictEqual } from 'node:util';
import type { Knex } from 'knex';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { toJsonb } from '@/db/json';

/** Keeps the wind of a passage: the newest forecast where nothing changed, else a new numbered one. */
export async function keepForecast(
  trx: Knex,
  passageId: string,
  wind: PassagePlan['wind'],
  enteredBy: string,
): Promise<{ id: string }> {
  const newest = await trx('forecasts').where({ passage_id: passageId }).orderBy('number', 'desc').first();
  if (
    newest &&
    newest.source === wind.source &&
    newest.issued_at.getTime() === Date.parse(wind.issuedAt) &&
    isDeepStrictEqual(newest.rows, wind.rows)
  ) {
    return { id: newest.id };
  }
  const [row] = await trx('forecasts')
    .insert({
      passage_id: passageId,
      number: (newest?.number ?? 0) + 1,
      kind: 'typed',
      source: wind.source,
      issued_at: new Date(wind.issuedAt),
      rows: toJsonb(wind.rows),
      entered_by: enteredBy,
    })
    .returning('id');
  return row!;
}
