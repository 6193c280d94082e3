import type { Transaction } from '../../db/client';
import { insertThing } from '../../db/kept-thing-store';
import type { Actor, Answer } from '../../http/route-definition';
import { recordAuditEntry } from '../audit/record-audit-entry';
import type { CollectionDefinition } from './collections';

export async function createThing<Spec extends { name: string }>(
  tx: Transaction,
  definition: CollectionDefinition<Spec>,
  { actor, spec }: { actor: Actor; spec: Spec },
): Promise<Answer> {
  const { accountId, userId } = actor;
  await definition.check(tx, { accountId, spec });
  const thing = await insertThing(tx, definition.tables, { accountId, spec, createdBy: userId });
  await recordAuditEntry(tx, {
    accountId,
    actorUserId: userId,
    action: `${definition.subjectKind}.created`,
    subjectKind: definition.subjectKind,
    subjectId: thing.id,
  });
  return { status: 201, body: thing, etag: thing.revision.id };
}
