import { and, asc, desc, eq, ilike, inArray, isNotNull, isNull, lt, sql, type SQL } from 'drizzle-orm';
import type { ArchivedFilter } from '../../shared/contract/fields';
import type { KeptThing, NamedRevision, Page, Revision } from '../../shared/contract/kept-things';
import { PAGE_SIZE } from '../../shared/contract/rules';
import type { Queryable, Transaction } from './client';
import { newId } from './new-id';
import { people, type RevisionTable, type ThingTable } from './schema';

/** The two tables of one collection. */
export interface ThingTables<Spec> {
  things: ThingTable;
  revisions: RevisionTable<Spec>;
}

interface Named {
  name: string;
}

interface NewRevision<Spec> {
  accountId: string;
  spec: Spec;
  note?: string;
  /** Null for what comes with the product. */
  createdBy: string | null;
}

export async function insertThing<Spec extends Named>(
  tx: Transaction,
  tables: ThingTables<Spec>,
  { accountId, spec, note, createdBy }: NewRevision<Spec>,
): Promise<KeptThing<Spec>> {
  const id = newId();
  const revisionId = newId();
  // The deferred foreign key is checked at commit, when both rows are there.
  const [thing] = await tx
    .insert(tables.things)
    .values({ id, accountId, currentRevisionId: revisionId, name: spec.name })
    .returning();
  const revision = await insertRow(tx, tables, {
    id: revisionId,
    accountId,
    thingId: id,
    number: 1,
    spec,
    note,
    createdBy,
  });
  return { id, created_at: (thing?.createdAt ?? new Date()).toISOString(), archived_at: null, revision };
}

/** Adds a revision and makes it the current one. The thing must be locked (lockThing). */
export async function insertRevision<Spec extends Named>(
  tx: Transaction,
  tables: ThingTables<Spec>,
  { accountId, spec, note, createdBy, base }: NewRevision<Spec> & { base: KeptThing<Spec> },
): Promise<KeptThing<Spec>> {
  const id = newId();
  const number = base.revision.number + 1;
  const revision = await insertRow(tx, tables, {
    id,
    accountId,
    thingId: base.id,
    number,
    spec,
    note,
    createdBy,
  });
  await tx
    .update(tables.things)
    .set({ currentRevisionId: id, name: spec.name })
    .where(eq(tables.things.id, base.id));
  return { ...base, revision };
}

/** Waits for whoever else edits the thing now, then reads it as it is. */
export async function lockThing<Spec>(
  tx: Transaction,
  tables: ThingTables<Spec>,
  key: { accountId: string; id: string },
): Promise<KeptThing<Spec> | undefined> {
  await tx.select({ id: tables.things.id }).from(tables.things).where(isThing(tables, key)).for('update');
  return findThing(tx, tables, key);
}

export async function findThing<Spec>(
  db: Queryable,
  tables: ThingTables<Spec>,
  key: { accountId: string; id: string },
): Promise<KeptThing<Spec> | undefined> {
  const [row] = await selectThings(db, tables).where(isThing(tables, key));
  return row && asKeptThing<Spec>(row);
}

/** Those of the ids that the account has, in no order. */
export async function findThings<Spec>(
  db: Queryable,
  tables: ThingTables<Spec>,
  { accountId, ids }: { accountId: string; ids: readonly string[] },
): Promise<KeptThing<Spec>[]> {
  if (ids.length === 0) return [];
  const { things } = tables;
  const rows = await selectThings(db, tables).where(
    and(eq(things.accountId, accountId), inArray(things.id, [...ids])),
  );
  return rows.map((row) => asKeptThing<Spec>(row));
}

/** Takes the thing out of the lists or puts it back. The thing must be locked (lockThing). */
export async function setArchived<Spec>(
  tx: Transaction,
  { things }: ThingTables<Spec>,
  { thing, isArchived }: { thing: KeptThing<Spec>; isArchived: boolean },
): Promise<KeptThing<Spec>> {
  const archivedAt = isArchived ? new Date() : null;
  await tx.update(things).set({ archivedAt }).where(eq(things.id, thing.id));
  return { ...thing, archived_at: archivedAt?.toISOString() ?? null };
}

/** Current names by id, of several collections in one question; only the account's. */
export async function findNames(
  db: Queryable,
  accountId: string,
  wanted: readonly { things: ThingTable; ids: readonly string[] }[],
): Promise<Map<string, string>> {
  const questions = wanted
    .filter(({ ids }) => ids.length > 0)
    .map(
      ({ things, ids }) =>
        sql`SELECT ${things.id} AS id, ${things.name} AS name FROM ${things}
          WHERE ${and(eq(things.accountId, accountId), inArray(things.id, [...new Set(ids)]))}`,
    );
  if (questions.length === 0) return new Map();
  const rows = await db.execute<{ id: string; name: string }>(sql.join(questions, sql` UNION ALL `));
  return new Map(rows.map(({ id, name }) => [id, name]));
}

/** Those of the ids that are archived. */
export async function findArchivedIds(
  db: Queryable,
  things: ThingTable,
  ids: readonly string[],
): Promise<Set<string>> {
  if (ids.length === 0) return new Set();
  const rows = await db
    .select({ id: things.id })
    .from(things)
    .where(and(inArray(things.id, [...ids]), isNotNull(things.archivedAt)));
  return new Set(rows.map(({ id }) => id));
}

export interface ListRequest {
  accountId: string;
  after?: string;
  limit?: number;
  /** Part of the name, in any case. */
  search?: string;
  archived?: ArchivedFilter;
  /** A further condition on the thing or its current revision. */
  only?: SQL;
  /** Newest first if absent. `by` speaks of the thing's own columns, so that a page can begin after any thing. */
  order?: { by: SQL; isRising: boolean };
}

/** A page after the last id seen, by the order's key and then by id, so that nothing comes twice or never. */
export async function listThings<Spec>(
  db: Queryable,
  tables: ThingTables<Spec>,
  { accountId, after, limit = PAGE_SIZE, search, archived = 'no', only, order }: ListRequest,
): Promise<Page<KeptThing<Spec>>> {
  const { things } = tables;
  const direction = order?.isRising === true ? asc : desc;
  const rows = await selectThings(db, tables)
    .where(
      and(
        eq(things.accountId, accountId),
        archived === 'only' ? isNotNull(things.archivedAt) : isNull(things.archivedAt),
        search === undefined || search === '' ? undefined : ilike(things.name, `%${literally(search)}%`),
        only,
        after === undefined ? undefined : isAfter(things, { after, order }),
      ),
    )
    .orderBy(...(order ? [direction(order.by)] : []), direction(things.id))
    .limit(limit + 1);
  const items = rows.slice(0, limit).map((row) => asKeptThing<Spec>(row));
  return { items, next_after: rows.length > limit ? (items.at(-1)?.id ?? null) : null };
}

function isAfter(things: ThingTable, { after, order }: { after: string } & Pick<ListRequest, 'order'>): SQL {
  if (!order) return lt(things.id, after);
  const { by, isRising } = order;
  const last = sql`(SELECT ${by}, ${things.id} FROM ${things} WHERE ${things.id} = ${after})`;
  return isRising ? sql`(${by}, ${things.id}) > ${last}` : sql`(${by}, ${things.id}) < ${last}`;
}

/** What stands for anything in LIKE stands here for itself. */
function literally(text: string): string {
  return text.replace(/[\\%_]/g, '\\$&');
}

/** Newest first, with the author's name from the erasable table. */
export async function listRevisions<Spec>(
  db: Queryable,
  tables: ThingTables<Spec>,
  {
    accountId,
    id,
    after,
    limit = PAGE_SIZE,
  }: { accountId: string; id: string; after?: string; limit?: number },
): Promise<Page<NamedRevision<Spec>>> {
  const { revisions } = tables;
  const rows = await db
    .select({ revision: revisions, authorName: people.name })
    .from(revisions)
    .leftJoin(people, eq(people.userId, revisions.createdBy))
    .where(
      and(
        eq(revisions.accountId, accountId),
        eq(revisions.thingId, id),
        after === undefined ? undefined : lt(revisions.id, after),
      ),
    )
    .orderBy(desc(revisions.id))
    .limit(limit + 1);
  const items = rows.slice(0, limit).map(({ revision, authorName }) => ({
    ...asRevision<Spec>(revision),
    created_by_name: authorName,
  }));
  return { items, next_after: rows.length > limit ? (items.at(-1)?.id ?? null) : null };
}

/** Revisions by their own ids, with the thing each belongs to; only the account's. */
export async function findRevisions<Spec>(
  db: Queryable,
  tables: ThingTables<Spec>,
  { accountId, ids }: { accountId: string; ids: readonly string[] },
): Promise<{ thingId: string; revision: Revision<Spec> }[]> {
  if (ids.length === 0) return [];
  const { revisions } = tables;
  const rows = await db
    .select()
    .from(revisions)
    .where(and(eq(revisions.accountId, accountId), inArray(revisions.id, [...ids])));
  return rows.map((row) => ({ thingId: row.thingId, revision: asRevision<Spec>(row) }));
}

type ThingRow = ThingTable['$inferSelect'];
/** As selected: the column's type is that of its table, which a generic function cannot see through. */
type RevisionRow = Omit<RevisionTable<unknown>['$inferSelect'], 'spec'> & { spec: unknown };

function selectThings<Spec>(db: Queryable, { things, revisions }: ThingTables<Spec>) {
  return db
    .select({ thing: things, revision: revisions })
    .from(things)
    .innerJoin(revisions, and(eq(revisions.thingId, things.id), eq(revisions.id, things.currentRevisionId)))
    .$dynamic();
}

function isThing<Spec>({ things }: ThingTables<Spec>, { accountId, id }: { accountId: string; id: string }) {
  return and(eq(things.accountId, accountId), eq(things.id, id));
}

async function insertRow<Spec>(
  tx: Transaction,
  { revisions }: ThingTables<Spec>,
  row: {
    id: string;
    accountId: string;
    thingId: string;
    number: number;
    spec: Spec;
    note?: string;
    createdBy: string | null;
  },
): Promise<Revision<Spec>> {
  const table: RevisionTable<unknown> = revisions;
  const [inserted] = await tx
    .insert(table)
    .values({ ...row, note: row.note ?? '' })
    .returning();
  if (!inserted) throw new Error('The revision was not written.');
  return asRevision<Spec>(inserted);
}

function asKeptThing<Spec>({ thing, revision }: { thing: ThingRow; revision: RevisionRow }): KeptThing<Spec> {
  return {
    id: thing.id,
    created_at: thing.createdAt.toISOString(),
    archived_at: thing.archivedAt?.toISOString() ?? null,
    revision: asRevision<Spec>(revision),
  };
}

function asRevision<Spec>(row: RevisionRow): Revision<Spec> {
  return {
    id: row.id,
    number: row.number,
    created_at: row.createdAt.toISOString(),
    created_by: row.createdBy,
    note: row.note,
    spec: row.spec as Spec,
  };
}
