/** True where PostgreSQL refused a row because of the named unique index or constraint (SQLSTATE 23505). */
export function isUniqueViolation(error: unknown, constraint: string): boolean {
  const fault = error as { code?: unknown; constraint?: unknown } | null;
  return fault?.code === '23505' && fault.constraint === constraint;
}
