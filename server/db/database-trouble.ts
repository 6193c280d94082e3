/** What PostgreSQL and its driver say when the database cannot answer now, as against refusing what was asked. */
const SILENT_CODES = new Set([
  'CONNECT_TIMEOUT',
  'CONNECTION_CLOSED',
  'CONNECTION_ENDED',
  'CONNECTION_DESTROYED',
  'ECONNREFUSED',
  'ECONNRESET',
  'ENOTFOUND',
  'ETIMEDOUT',
  'EPIPE',
  // too many connections · statement timeout · lock timeout · idle in transaction · shutting down · starting up
  '53300',
  '57014',
  '55P03',
  '25P03',
  '57P01',
  '57P02',
  '57P03',
]);

/** True where trying again later may help; looks through the causes that drizzle wraps around the driver's error. */
export function isDatabaseSilent(error: unknown): boolean {
  for (let cause: unknown = error; cause instanceof Error; cause = cause.cause) {
    const code = 'code' in cause ? cause.code : undefined;
    if (typeof code === 'string' && (SILENT_CODES.has(code) || code.startsWith('08'))) return true;
  }
  return false;
}
