import { and, desc, eq, lt } from 'drizzle-orm';
import type { AuditEntry } from '../../../shared/contract/accounts';
import type { Page } from '../../../shared/contract/kept-things';
import { PAGE_SIZE } from '../../../shared/contract/rules';
import type { Queryable } from '../../db/client';
import { auditLog, people } from '../../db/schema';

/** Newest first. Names come from the erasable table: once erased, only the entry remains. */
export async function listAuditEntries(
  db: Queryable,
  { accountId, after, limit = PAGE_SIZE }: { accountId: string; after?: string; limit?: number },
): Promise<Page<AuditEntry>> {
  const rows = await db
    .select({ entry: auditLog, actorName: people.name })
    .from(auditLog)
    .leftJoin(people, eq(people.userId, auditLog.actorUserId))
    .where(and(eq(auditLog.accountId, accountId), after === undefined ? undefined : lt(auditLog.id, after)))
    .orderBy(desc(auditLog.id))
    .limit(limit + 1);
  const items = rows.slice(0, limit).map(({ entry, actorName }) => ({
    id: entry.id,
    at: entry.at.toISOString(),
    actor_name: actorName,
    action: entry.action,
    subject_kind: entry.subjectKind,
    subject_id: entry.subjectId,
  }));
  return { items, next_after: rows.length > limit ? (items.at(-1)?.id ?? null) : null };
}
