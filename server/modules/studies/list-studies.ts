import { desc, eq, sql, type SQL } from 'drizzle-orm';
import type { StudySort } from '../../../shared/contract/fields';
import type { Page } from '../../../shared/contract/kept-things';
import type { Study } from '../../../shared/contract/studies';
import type { Queryable } from '../../db/client';
import { listThings, type ListRequest } from '../../db/kept-thing-store';
import { results, studies, studyRevisions } from '../../db/schema';
import { describeStudies } from './get-study';
import { TABLES } from './study-tables';

interface Listing extends Pick<ListRequest, 'after' | 'limit' | 'search' | 'archived'> {
  accountId: string;
  tag?: string;
  sort?: StudySort;
}

/** A page of studies, each with what its card says. */
export async function listStudies(
  db: Queryable,
  { tag, sort = 'newest', ...listing }: Listing,
): Promise<Page<Study>> {
  const page = await listThings(db, TABLES.studies, {
    ...listing,
    only: tag === undefined ? undefined : hasTag(tag),
    order: orderOf(db, sort),
  });
  return { ...page, items: await describeStudies(db, listing.accountId, page.items) };
}

function hasTag(tag: string): SQL {
  return sql`${studyRevisions.spec} @> ${JSON.stringify({ tags: [tag] })}::jsonb`;
}

function orderOf(db: Queryable, sort: StudySort): ListRequest['order'] {
  if (sort === 'newest') return undefined;
  if (sort === 'name') return { by: sql`lower(${studies.name})`, isRising: true };
  // A life that no limit ends by the horizon is longer than any that one ends.
  const days = db
    .select({ days: sql`coalesce((${results.headline} ->> 'shelf_life_days')::float8, 'Infinity')` })
    .from(results)
    .where(eq(results.studyId, studies.id))
    .orderBy(desc(results.number))
    .limit(1);
  return { by: sql`(${days})`, isRising: false };
}
