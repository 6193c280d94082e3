import { eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { people } from '../../db/schema';
import type { Answer } from '../../http/route-definition';
import type { JobPort } from '../../jobs/job-port';
import { recordAuditEntry } from '../audit/record-audit-entry';
import { countAttempt } from '../session/limit-attempts';

/** Always 202: the answer does not tell whether anybody has that address. The mail goes out by a job. */
export async function requestReset(
  { db, jobs }: { db: Database; jobs: JobPort },
  { email, networkAddress }: { email: string; networkAddress: string },
): Promise<Answer> {
  await countAttempt(db, { kind: 'password_reset', email, networkAddress });
  await db.transaction(async (tx) => {
    const [person] = await tx
      .select({ userId: people.userId })
      .from(people)
      .where(eq(sql`lower(${people.email})`, email.toLowerCase()));
    if (!person) return;
    const resetId = newId();
    await jobs.enqueue(tx, 'send-password-reset', { user_id: person.userId, reset_id: resetId });
    await recordAuditEntry(tx, {
      accountId: null,
      actorUserId: null,
      action: 'password_reset.requested',
      subjectKind: 'user',
      subjectId: person.userId,
    });
  });
  return { status: 202 };
}
