import type { Queryable } from '../../db/client';
import { newId } from '../../db/new-id';
import { auditLog } from '../../db/schema';

export interface NewAuditEntry {
  accountId: string | null;
  actorUserId: string | null;
  /** Subject and past tense: 'laminate.revised'. */
  action: string;
  subjectKind: string;
  subjectId: string | null;
}

/** Writes down what happened, in the transaction in which it happens. */
export async function recordAuditEntry(db: Queryable, entry: NewAuditEntry): Promise<void> {
  await db.insert(auditLog).values({ id: newId(), ...entry });
}
