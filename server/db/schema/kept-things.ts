import { sql } from 'drizzle-orm';
import { foreignKey, index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { FoodSpec } from '../../../shared/contract/foods';
import type { LaminateSpec } from '../../../shared/contract/laminates';
import type { MaterialSpec } from '../../../shared/contract/materials';
import type { PackSpec } from '../../../shared/contract/packs';
import type { RouteSpec } from '../../../shared/contract/routes';
import type { StudySpec } from '../../../shared/contract/studies';
import { accounts } from './accounts';
import { createdAt, id, instant } from './columns';
import { users } from './people';

/**
 * A thing is its id, which revision is current, and whether it is archived; all it says stands in its revisions, which
 * never change. The current revision's name is repeated here, for search and order.
 */
function thingTable(name: string) {
  return pgTable(
    name,
    {
      id: id(),
      accountId: uuid('account_id')
        .notNull()
        .references(() => accounts.id),
      /** A deferred foreign key to its own revisions stands in the hand-written migration. */
      currentRevisionId: uuid('current_revision_id').notNull(),
      name: text('name').notNull(),
      /** Null: in use. */
      archivedAt: instant('archived_at'),
      createdAt: createdAt(),
    },
    (table) => [
      unique(`${name}_of_account`).on(table.accountId, table.id),
      index(`${name}_by_name`).on(table.accountId, sql`lower(${table.name})`, table.id),
    ],
  );
}

/** `isAskedInside`: specs are searched for what they name (a material, a laminate, a tag), so they are indexed. */
function revisionTable<Spec>(
  name: string,
  things: ReturnType<typeof thingTable>,
  { isAskedInside = false }: { isAskedInside?: boolean } = {},
) {
  return pgTable(
    name,
    {
      id: id(),
      accountId: uuid('account_id').notNull(),
      thingId: uuid('thing_id').notNull(),
      number: integer('number').notNull(),
      spec: jsonb('spec').$type<Spec>().notNull(),
      note: text('note').notNull().default(''),
      createdBy: uuid('created_by').references(() => users.id),
      createdAt: createdAt(),
    },
    (table) => [
      foreignKey({
        name: `${name}_thing`,
        columns: [table.accountId, table.thingId],
        foreignColumns: [things.accountId, things.id],
      }),
      unique(`${name}_number`).on(table.thingId, table.number),
      unique(`${name}_of_thing`).on(table.thingId, table.id),
      index(`${name}_of_account`).on(table.accountId, table.thingId),
      ...(isAskedInside ? [index(`${name}_inside`).using('gin', sql`${table.spec} jsonb_path_ops`)] : []),
    ],
  );
}

export const materials = thingTable('materials');
export const materialRevisions = revisionTable<MaterialSpec>('material_revisions', materials);
export const laminates = thingTable('laminates');
export const laminateRevisions = revisionTable<LaminateSpec>('laminate_revisions', laminates, {
  isAskedInside: true,
});
export const packs = thingTable('packs');
export const packRevisions = revisionTable<PackSpec>('pack_revisions', packs, { isAskedInside: true });
export const foods = thingTable('foods');
export const foodRevisions = revisionTable<FoodSpec>('food_revisions', foods);
export const routes = thingTable('routes');
export const routeRevisions = revisionTable<RouteSpec>('route_revisions', routes);
export const studies = thingTable('studies');
export const studyRevisions = revisionTable<StudySpec>('study_revisions', studies, {
  isAskedInside: true,
});

export type ThingTable = ReturnType<typeof thingTable>;
export type RevisionTable<Spec> = ReturnType<typeof revisionTable<Spec>>;
