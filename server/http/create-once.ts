import { and, eq } from 'drizzle-orm';
import type { Database, Transaction } from '../db/client';
import { idempotencyKeys } from '../db/schema';
import { AppError } from './app-error';
import type { Answer, Once } from './route-definition';

/**
 * Runs a create so that the same Idempotency-Key makes one thing. The key's row is the first thing that the
 * transaction writes: a second request with it waits there for the first one to end, and then gets its answer; if
 * the first one failed, nothing of it stays and the second runs. The same key with another body is refused.
 */
export async function createOnce(
  db: Database,
  once: Once,
  create: (tx: Transaction) => Promise<Answer>,
): Promise<Answer> {
  const { userId, key, requestSha256 } = once;
  const isThisKey = and(eq(idempotencyKeys.userId, userId), eq(idempotencyKeys.key, key));
  return db.transaction(async (tx) => {
    const reserved = await tx
      .insert(idempotencyKeys)
      .values({ userId, key, requestSha256, status: 0, body: '' })
      .onConflictDoNothing()
      .returning();
    if (reserved.length === 0) {
      const [earlier] = await tx.select().from(idempotencyKeys).where(isThisKey);
      return answerAgain(earlier, requestSha256);
    }
    const answer = await create(tx);
    const json = JSON.stringify(answer.body);
    await tx
      .update(idempotencyKeys)
      .set({ status: answer.status, body: json, etag: answer.etag })
      .where(isThisKey);
    return { ...answer, json };
  });
}

function answerAgain(
  earlier: typeof idempotencyKeys.$inferSelect | undefined,
  requestSha256: string,
): Answer {
  if (earlier?.requestSha256 !== requestSha256) {
    throw new AppError(
      'idempotency_key_reused',
      'This Idempotency-Key was used for something else. Take a new one.',
    );
  }
  return {
    status: earlier.status,
    body: JSON.parse(earlier.body),
    json: earlier.body,
    etag: earlier.etag ?? undefined,
  };
}
