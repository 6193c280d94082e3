import { and, eq, gt } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { passwordResetTokens, sessions, users } from '../../db/schema';
import { inputInvalid } from '../../http/app-error';
import type { Answer } from '../../http/route-definition';
import { sha256Hex } from '../../http/sha256';
import { recordAuditEntry } from '../audit/record-audit-entry';
import { hashPassword } from '../session/hash-password';

/** Sets the new password, ends every session of the person, and makes every link sent so far worthless. */
export async function redeemReset(
  { db }: { db: Database },
  { token, password }: { token: string; password: string },
): Promise<Answer> {
  const isValid = and(
    eq(passwordResetTokens.tokenSha256, sha256Hex(token)),
    gt(passwordResetTokens.expiresAt, new Date()),
  );
  // Hashing is dear on purpose: nobody gets it for a token that does not exist.
  const [found] = await db
    .select({ userId: passwordResetTokens.userId })
    .from(passwordResetTokens)
    .where(isValid);
  if (!found) throw linkIsWorthless();
  const passwordHash = await hashPassword(password);
  await db.transaction(async (tx) => {
    const [redeemed] = await tx.delete(passwordResetTokens).where(isValid).returning();
    if (!redeemed) throw linkIsWorthless();
    const { userId } = redeemed;
    await tx.update(users).set({ passwordHash }).where(eq(users.id, userId));
    await tx.delete(sessions).where(eq(sessions.userId, userId));
    await tx.delete(passwordResetTokens).where(eq(passwordResetTokens.userId, userId));
    await recordAuditEntry(tx, {
      accountId: null,
      actorUserId: userId,
      action: 'password.changed',
      subjectKind: 'user',
      subjectId: userId,
    });
  });
  return { status: 204 };
}

function linkIsWorthless() {
  return inputInvalid([
    { path: 'token', message: 'This link was used or is older than an hour. Ask for a new one.' },
  ]);
}
