import { and, desc, eq, or, sql, type SQL, type SQLWrapper } from 'drizzle-orm';
import { MOST_USES, type Collection, type Uses } from '../../../shared/contract/kept-things';
import type { Queryable } from '../../db/client';
import type { ThingTables } from '../../db/kept-thing-store';
import { laminateRevisions, laminates, packRevisions, packs, studies, studyRevisions } from '../../db/schema';

/** Of the laminates and packs between a material and its studies, only so many are followed, newest first. */
const MOST_BETWEEN = 500;

const LAMINATES = { things: laminates, revisions: laminateRevisions };
const PACKS = { things: packs, revisions: packRevisions };
const STUDIES = { things: studies, revisions: studyRevisions };

interface Named {
  id: string;
  name: string;
}

/** What uses a thing now, by current revisions; archived users are users too. */
export async function findUses(
  db: Queryable,
  { accountId, collection, id }: { accountId: string; collection: Collection; id: string },
): Promise<Uses> {
  const studiesWith = (holds: SQL | undefined) =>
    findUsers(db, STUDIES, { accountId, holds, limit: MOST_USES });
  const { spec } = studyRevisions;

  if (collection === 'foods') return onlyStudies(await studiesWith(contains(spec, { food_id: id })));
  if (collection === 'routes') return onlyStudies(await studiesWith(contains(spec, { route_id: id })));
  if (collection === 'packs') return onlyStudies(await studiesWith(contains(spec, { pack_id: id })));

  const walls =
    collection === 'laminates'
      ? [{ id, name: '' }]
      : await findUsers(db, LAMINATES, {
          accountId,
          holds: contains(laminateRevisions.spec, { layers: [{ material_id: id }] }),
          limit: MOST_BETWEEN,
        });
  if (walls.length === 0) return onlyStudies([]);
  const wallIds = walls.map((wall) => wall.id);
  const trays = await findUsers(db, PACKS, {
    accountId,
    holds:
      wallIds.length === 1
        ? contains(packRevisions.spec, { form: { tray_laminate_id: wallIds[0] } })
        : sql`${packRevisions.spec} #>> '{form,tray_laminate_id}' = ANY(${sql.param(wallIds)}::text[])`,
    limit: MOST_BETWEEN,
  });
  const trayIds = trays.map((tray) => tray.id);
  const holdsAny = or(
    wallIds.length === 1
      ? contains(spec, { laminate_ids: wallIds })
      : sql`${spec} -> 'laminate_ids' ?| ${sql.param(wallIds)}::text[]`,
    trayIds.length === 0 ? undefined : sql`${spec} ->> 'pack_id' = ANY(${sql.param(trayIds)}::text[])`,
  );
  return {
    laminates: collection === 'materials' ? walls.slice(0, MOST_USES) : [],
    packs: collection === 'laminates' ? trays.slice(0, MOST_USES) : [],
    studies: await studiesWith(holdsAny),
  };
}

function onlyStudies(found: Named[]): Uses {
  return { laminates: [], packs: [], studies: found };
}

/** Things whose current revision holds it, newest first. */
async function findUsers<Spec>(
  db: Queryable,
  { things, revisions }: ThingTables<Spec>,
  { accountId, holds, limit }: { accountId: string; holds: SQL | undefined; limit: number },
): Promise<Named[]> {
  return db
    .select({ id: things.id, name: things.name })
    .from(things)
    .innerJoin(revisions, and(eq(revisions.thingId, things.id), eq(revisions.id, things.currentRevisionId)))
    .where(and(eq(things.accountId, accountId), holds))
    .orderBy(desc(things.id))
    .limit(limit);
}

/** Answered by the index over what specs hold. */
function contains(spec: SQLWrapper, content: object): SQL {
  return sql`${spec} @> ${JSON.stringify(content)}::jsonb`;
}
