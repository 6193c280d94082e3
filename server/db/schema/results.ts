import {
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import type { StudyHeadline } from '../../../shared/contract/studies';
import { bytea, createdAt, id } from './columns';
import { studies, studyRevisions } from './kept-things';
import { users } from './people';

export type StoredHeadline = Omit<StudyHeadline, 'result_id' | 'created_at' | 'engine_version'>;

/** What a study answered, with everything that went in. Never changed, never deleted. */
export const results = pgTable(
  'results',
  {
    id: id(),
    accountId: uuid('account_id').notNull(),
    studyId: uuid('study_id').notNull(),
    studyRevisionId: uuid('study_revision_id').notNull(),
    /** Counts within the study. */
    number: integer('number').notNull(),
    engineVersion: text('engine_version').notNull(),
    /** RFC 8785 canonical JSON, UTF-8. */
    body: bytea('body').notNull(),
    sha256: bytea('sha256').notNull(),
    /** What a card shows, so that a list need not open the bodies. */
    headline: jsonb('headline').$type<StoredHeadline>().notNull(),
    createdBy: uuid('created_by').references(() => users.id),
    createdAt: createdAt(),
  },
  (table) => [
    foreignKey({
      name: 'results_study',
      columns: [table.accountId, table.studyId],
      foreignColumns: [studies.accountId, studies.id],
    }),
    foreignKey({
      name: 'results_study_revision',
      columns: [table.studyId, table.studyRevisionId],
      foreignColumns: [studyRevisions.thingId, studyRevisions.id],
    }),
    unique('results_number').on(table.studyId, table.number),
    index('results_of_account').on(table.accountId, table.id),
  ],
);

/** The revisions that a result was computed from. */
export const resultPins = pgTable(
  'result_pins',
  {
    resultId: uuid('result_id')
      .notNull()
      .references(() => results.id),
    collection: text('collection', {
      enum: ['materials', 'laminates', 'packs', 'foods', 'routes'],
    }).notNull(),
    thingId: uuid('thing_id').notNull(),
    revisionId: uuid('revision_id').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.resultId, table.revisionId] }),
    index('result_pins_by_revision').on(table.revisionId),
  ],
);
