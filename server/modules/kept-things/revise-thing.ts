import type { Database } from '../../db/client';
import { insertRevision, lockThing } from '../../db/kept-thing-store';
import { editedMeanwhile, notFound } from '../../http/app-error';
import type { Actor, Answer } from '../../http/route-definition';
import { recordAuditEntry } from '../audit/record-audit-entry';
import type { CollectionDefinition } from './collections';

interface Revising<Spec> {
  actor: Actor;
  id: string;
  /** The revision that the edit started from. */
  ifMatch: string;
  spec: Spec;
  note?: string;
}

export async function reviseThing<Spec extends { name: string }>(
  db: Database,
  definition: CollectionDefinition<Spec>,
  { actor, id, ifMatch, spec, note }: Revising<Spec>,
): Promise<Answer> {
  const { accountId, userId } = actor;
  return db.transaction(async (tx) => {
    const base = await lockThing(tx, definition.tables, { accountId, id });
    if (!base) throw notFound();
    if (base.revision.id !== ifMatch) throw editedMeanwhile(base);
    await definition.check(tx, { accountId, spec, base: base.revision.spec });
    const thing = await insertRevision(tx, definition.tables, {
      accountId,
      spec,
      note,
      createdBy: userId,
      base,
    });
    await recordAuditEntry(tx, {
      accountId,
      actorUserId: userId,
      action: `${definition.subjectKind}.revised`,
      subjectKind: definition.subjectKind,
      subjectId: id,
    });
    return { status: 200, body: thing, etag: thing.revision.id };
  });
}
