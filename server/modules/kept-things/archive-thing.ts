import type { KeptThing } from '../../../shared/contract/kept-things';
import type { Transaction } from '../../db/client';
import { lockThing, setArchived, type ThingTables } from '../../db/kept-thing-store';
import { notFound } from '../../http/app-error';
import type { Actor } from '../../http/route-definition';
import { recordAuditEntry } from '../audit/record-audit-entry';

interface Archiving {
  actor: Actor;
  id: string;
  isArchived: boolean;
  /** As the audit log calls it: 'laminate'. */
  subjectKind: string;
}

/** Archives a thing or brings it back. Said twice, it changes nothing and writes nothing down. */
export async function archiveThing<Spec>(
  tx: Transaction,
  tables: ThingTables<Spec>,
  { actor, id, isArchived, subjectKind }: Archiving,
): Promise<KeptThing<Spec>> {
  const { accountId, userId } = actor;
  const thing = await lockThing(tx, tables, { accountId, id });
  if (!thing) throw notFound();
  if ((thing.archived_at !== null) === isArchived) return thing;
  await recordAuditEntry(tx, {
    accountId,
    actorUserId: userId,
    action: `${subjectKind}.${isArchived ? 'archived' : 'brought_back'}`,
    subjectKind,
    subjectId: id,
  });
  return setArchived(tx, tables, { thing, isArchived });
}
