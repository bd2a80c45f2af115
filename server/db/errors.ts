/** True when an insert met a row that is already there (SQLSTATE 23505, unique_violation). */
export function isUniqueViolation(error: unknown, constraint?: string): boolean {
  const cause = (error as { cause?: { code?: string; constraint?: string } } | undefined)?.cause;
  return cause?.code === '23505' && (constraint === undefined || cause.constraint === constraint);
}
