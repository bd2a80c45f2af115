/**
 * An error as it goes into a log: where it happened, never the values of a query, which hold tokens, links and
 * what members wrote.
 */
export function safeError(error: unknown): Record<string, unknown> {
  if (!(error instanceof Error)) return { type: typeof error };
  const { query } = error as { query?: unknown };
  const cause = error.cause instanceof Error ? safeError(error.cause) : undefined;
  const code = (error as { code?: unknown }).code;
  // A failed query's message and stack repeat its values.
  const told =
    query === undefined ? { message: error.message, stack: error.stack } : { query: String(query) };
  return {
    type: error.name,
    ...told,
    ...(code === undefined ? {} : { code }),
    ...(cause === undefined ? {} : { cause }),
  };
}
