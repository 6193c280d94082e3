import { and, desc, eq, inArray, lt, max, ne, sql } from 'drizzle-orm';
import type { Page } from '../../../shared/contract/kept-things';
import {
  NEWER_KINDS,
  type NewerThing,
  type StudyHeadline,
  type StudyResult,
} from '../../../shared/contract/studies';
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

/** Results come whole, with their courses: fewer to a page than of other things. */
const RESULTS_PER_PAGE = 10;

export async function listResults(
  db: Queryable,
  {
    accountId,
    studyId,
    after,
    limit = RESULTS_PER_PAGE,
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

export type NewerThan = Omit<NewerThing, 'laminates'> & { revisionId: string };

const THINGS_BY_KIND = { material: materials, laminate: laminates, pack: packs, food: foods, route: routes };

interface NewerRow extends Record<string, unknown> {
  result_id: string;
  kind_order: number;
  id: string;
  name: string;
  revision_id: string;
}

/** By result: the things whose current revision is another than the one it pins. */
export async function findNewerThings(
  db: Queryable,
  resultIds: readonly string[],
): Promise<Map<string, NewerThan[]>> {
  const newer = new Map<string, NewerThan[]>();
  if (resultIds.length === 0) return newer;
  const questions = NEWER_KINDS.map((kind, order) => {
    const things = THINGS_BY_KIND[kind];
    return sql`SELECT ${resultPins.resultId} AS result_id, ${order}::int AS kind_order, ${things.id} AS id,
        ${things.name} AS name, ${things.currentRevisionId} AS revision_id
      FROM ${resultPins} JOIN ${things} ON ${things.id} = ${resultPins.thingId}
      WHERE ${and(
        inArray(resultPins.resultId, [...resultIds]),
        eq(resultPins.collection, `${kind}s`),
        ne(things.currentRevisionId, resultPins.revisionId),
      )}`;
  });
  const rows = await db.execute<NewerRow>(
    sql`${sql.join(questions, sql` UNION ALL `)} ORDER BY kind_order, id`,
  );
  for (const { result_id, kind_order, id, name, revision_id } of rows) {
    const kind = NEWER_KINDS[kind_order];
    if (kind) addNewer(newer, result_id, { kind, id, name, revisionId: revision_id });
  }
  return newer;
}

/** Two walls may pin two revisions of one material: it is newer once. */
function addNewer(newer: Map<string, NewerThan[]>, resultId: string, thing: NewerThan) {
  const known = newer.get(resultId) ?? [];
  if (!known.some((one) => one.id === thing.id)) newer.set(resultId, [...known, thing]);
}

function asStudyResult(row: ResultRow): StudyResult {
  const unsigned: Omit<StudyResult, 'sha256'> = JSON.parse(row.body.toString('utf8'));
  return { ...unsigned, sha256: row.sha256.toString('hex') };
}
