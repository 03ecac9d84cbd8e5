/** A value for a jsonb column. The driver would write a bare array as a PostgreSQL array, hence text. */
export function toJsonb<Value>(value: Value): Value {
  return JSON.stringify(value) as unknown as Value;
}
