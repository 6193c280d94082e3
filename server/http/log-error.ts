/**
 * What the log keeps of an error. A failed query carries its parameters (a password hash, an address) in its message,
 * its stack and a field of its own, so of such an error only the database's own words are kept.
 */
export function logError(error: unknown): Record<string, unknown> {
  if (!(error instanceof Error)) return { message: String(error) };
  if ('query' in error && 'params' in error) {
    return { type: error.name, message: 'A query failed.', cause: logCause(error.cause) };
  }
  return { type: error.name, message: error.message, stack: error.stack, cause: logCause(error.cause) };
}

function logCause(cause: unknown): Record<string, unknown> | undefined {
  if (cause === undefined || cause === null) return undefined;
  if (!(cause instanceof Error)) return { message: String(cause) };
  const code = 'code' in cause ? String(cause.code) : undefined;
  if ('query' in cause && 'params' in cause) return { type: cause.name, code, cause: logCause(cause.cause) };
  return { type: cause.name, code, message: cause.message };
}
