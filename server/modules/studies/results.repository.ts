import { and, desc, eq, inArray, lt, max, sql } from 'drizzle-orm';
import type { Page } from '../../../shared/contract/kept-things';
import { PAGE_SIZE } from '../../../shared/contract/rules';
import type { StudyHeadline, StudyResult } from '../../../shared/contract/studies';
import type { Queryable, Transaction } from '../../db/client';
import {
  foods,
  laminates,
  materials,
  packs,
  resultPins,
  results,
  routes,
  type StoredHeadline,
} from '../../db/schema';

export type Pin = Omit<typeof resultPins.$inferInsert, 'resultId'>;
type ResultRow = typeof results.$inferSelect;

interface NewResult {
  accountId: string;
  result: Omit<StudyResult, 'sha256'>;
  body: Buffer;
  sha256: Buffer;
  headline: StoredHeadline;
  pins: readonly Pin[];
}

/** Counts within the study, whose row is locked by whoever asks. */
export async function nextResultNumber(tx: Transaction, studyId: string): Promise<number> {
  const [last] = await tx
    .select({ number: max(results.number) })
    .from(results)
    .where(eq(results.studyId, studyId));
  return (last?.number ?? 0) + 1;
}

export async function insertResult(
  tx: Transaction,
  { accountId, result, body, sha256, headline, pins }: NewResult,
) {
  await tx.insert(results).values({
    id: result.id,
    accountId,
    studyId: result.study_id,
    studyRevisionId: result.study_revision_id,
    number: result.number,
    engineVersion: result.engine_version,
    body,
    sha256,
    headline,
    createdBy: result.created_by,
    createdAt: new Date(result.created_at),
  });
  await tx.insert(resultPins).values(pins.map((pin) => ({ ...pin, resultId: result.id })));
}

export async function findResult(
  db: Queryable,
  { accountId, studyId, id }: { accountId: string; studyId: string; id: string },
): Promise<StudyResult | undefined> {
  const [row] = await db
    .select()
    .from(results)
    .where(and(eq(results.accountId, accountId), eq(results.studyId, studyId), eq(results.id, id)));
  return row && asStudyResult(row);
}

export async function findLatestResult(db: Queryable, studyId: string): Promise<StudyResult | null> {
  const [row] = await db
    .select()
    .from(results)
    .where(eq(results.studyId, studyId))
    .orderBy(desc(results.number))
    .limit(1);
  return row ? asStudyResult(row) : null;
}

export async function listResults(
  db: Queryable,
  {
    accountId,
    studyId,
    after,
    limit = PAGE_SIZE,
  }: { accountId: string; studyId: string; after?: string; limit?: number },
): Promise<Page<StudyResult>> {
  const isAfter = after === undefined ? undefined : lt(results.id, after);
  const rows = await db
    .select()
    .from(results)
    .where(and(eq(results.accountId, accountId), eq(results.studyId, studyId), isAfter))
    .orderBy(desc(results.id))
    .limit(limit + 1);
  const items = rows.slice(0, limit).map(asStudyResult);
  return { items, next_after: rows.length > limit ? (items.at(-1)?.id ?? null) : null };
}

/** By study: the headline of its latest result. */
export async function findHeadlines(
  db: Queryable,
  studyIds: readonly string[],
): Promise<Map<string, StudyHeadline>> {
  if (studyIds.length === 0) return new Map();
  const rows = await db
    .selectDistinctOn([results.studyId], {
      studyId: results.studyId,
      id: results.id,
      createdAt: results.createdAt,
      engineVersion: results.engineVersion,
      headline: results.headline,
    })
    .from(results)
    .where(inArray(results.studyId, [...studyIds]))
    .orderBy(results.studyId, desc(results.number));
  return new Map(
    rows.map(({ studyId, id, createdAt, engineVersion, headline }) => [
      studyId,
      { result_id: id, created_at: createdAt.toISOString(), engine_version: engineVersion, ...headline },
    ]),
  );
}

/** Those of the results that pin a revision which is no longer the current one. */
export async function findOutdatedResults(db: Queryable, resultIds: readonly string[]): Promise<Set<string>> {
  if (resultIds.length === 0) return new Set();
  const currents = [materials, laminates, packs, foods, routes].map(
    (table) => sql`SELECT ${table.id} AS thing_id, ${table.currentRevisionId} AS revision_id FROM ${table}`,
  );
  const rows = await db
    .selectDistinct({ resultId: resultPins.resultId })
    .from(resultPins)
    .where(
      and(
        inArray(resultPins.resultId, [...resultIds]),
        sql`EXISTS (SELECT 1 FROM (${sql.join(currents, sql` UNION ALL `)}) AS current
          WHERE current.thing_id = ${resultPins.thingId} AND current.revision_id <> ${resultPins.revisionId})`,
      ),
    );
  return new Set(rows.map((row) => row.resultId));
}

function asStudyResult(row: ResultRow): StudyResult {
  const unsigned: Omit<StudyResult, 'sha256'> = JSON.parse(row.body.toString('utf8'));
  return { ...unsigned, sha256: row.sha256.toString('hex') };
}
