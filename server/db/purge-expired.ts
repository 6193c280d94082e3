import { lt } from 'drizzle-orm';
import type { Database } from './client';
import { attempts, idempotencyKeys, passwordResetTokens } from './schema';

const HOUR_MS = 3_600_000;

/** Removes what nothing looks at any more: attempts, answered creates, links that no longer work. */
export async function purgeExpired(db: Database): Promise<void> {
  const now = Date.now();
  await db.delete(attempts).where(lt(attempts.at, new Date(now - HOUR_MS)));
  await db.delete(idempotencyKeys).where(lt(idempotencyKeys.createdAt, new Date(now - 48 * HOUR_MS)));
  await db.delete(passwordResetTokens).where(lt(passwordResetTokens.expiresAt, new Date(now)));
}
