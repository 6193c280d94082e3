import type { Transaction } from '../../db/client';
import { lockThing } from '../../db/kept-thing-store';
import { notFound } from '../../http/app-error';
import type { Actor, Answer } from '../../http/route-definition';
import type { EnginePort } from '../../jobs/engine-workers';
import { recordAuditEntry } from '../audit/record-audit-entry';
import { runStudy } from './run-study';
import { TABLES } from './study-tables';

/** The same study again, with the newest revisions of what it uses. */
export async function rerunStudy(
  tx: Transaction,
  engine: EnginePort,
  { actor, id }: { actor: Actor; id: string },
): Promise<Answer> {
  const { accountId, userId } = actor;
  const study = await lockThing(tx, TABLES.studies, { accountId, id });
  if (!study) throw notFound();
  const result = await runStudy(tx, engine, { actor, study, base: study.revision.spec });
  await recordAuditEntry(tx, {
    accountId,
    actorUserId: userId,
    action: 'study.run',
    subjectKind: 'result',
    subjectId: result.id,
  });
  return { status: 201, body: result };
}
