import { foreignKey, index, integer, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { FoodSpec } from '../../../shared/contract/foods';
import type { LaminateSpec } from '../../../shared/contract/laminates';
import type { MaterialSpec } from '../../../shared/contract/materials';
import type { PackSpec } from '../../../shared/contract/packs';
import type { RouteSpec } from '../../../shared/contract/routes';
import type { StudySpec } from '../../../shared/contract/studies';
import { accounts } from './accounts';
import { createdAt, id } from './columns';
import { users } from './people';

/** A thing is its id and which revision is current; all it says stands in its revisions, which never change. */
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
      createdAt: createdAt(),
    },
    (table) => [unique(`${name}_of_account`).on(table.accountId, table.id)],
  );
}

function revisionTable<Spec>(name: string, things: ReturnType<typeof thingTable>) {
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
    ],
  );
}

export const materials = thingTable('materials');
export const materialRevisions = revisionTable<MaterialSpec>('material_revisions', materials);
export const laminates = thingTable('laminates');
export const laminateRevisions = revisionTable<LaminateSpec>('laminate_revisions', laminates);
export const packs = thingTable('packs');
export const packRevisions = revisionTable<PackSpec>('pack_revisions', packs);
export const foods = thingTable('foods');
export const foodRevisions = revisionTable<FoodSpec>('food_revisions', foods);
export const routes = thingTable('routes');
export const routeRevisions = revisionTable<RouteSpec>('route_revisions', routes);
export const studies = thingTable('studies');
export const studyRevisions = revisionTable<StudySpec>('study_revisions', studies);

export type ThingTable = ReturnType<typeof thingTable>;
export type RevisionTable<Spec> = ReturnType<typeof revisionTable<Spec>>;
