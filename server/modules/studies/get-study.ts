import type { KeptThing } from '../../../shared/contract/kept-things';
import type { Study, StudySpec, StudyWithResult } from '../../../shared/contract/studies';
import type { Queryable } from '../../db/client';
import { findThing, findThings } from '../../db/kept-thing-store';
import { notFound } from '../../http/app-error';
import { findHeadlines, findLatestResult, findOutdatedResults } from './results.repository';
import { TABLES } from './study-tables';

export async function getStudy(
  db: Queryable,
  key: { accountId: string; id: string },
): Promise<StudyWithResult> {
  const thing = await findThing(db, TABLES.studies, key);
  if (!thing) throw notFound();
  return withResult(db, key.accountId, thing);
}

export async function withResult(
  db: Queryable,
  accountId: string,
  thing: KeptThing<StudySpec>,
): Promise<StudyWithResult> {
  const [study] = await describeStudies(db, accountId, [thing]);
  if (!study) throw notFound();
  return { ...study, latest_result: await findLatestResult(db, thing.id) };
}

/** What a card says: the names of what a study uses, its answer, and whether newer data exist. */
export async function describeStudies(
  db: Queryable,
  accountId: string,
  things: readonly KeptThing<StudySpec>[],
): Promise<Study[]> {
  const specs = things.map((thing) => thing.revision.spec);
  const namesOf = async (collection: 'foods' | 'packs' | 'routes' | 'laminates', ids: readonly string[]) => {
    const found: KeptThing<{ name: string }>[] = await findThings<{ name: string }>(db, TABLES[collection], {
      accountId,
      ids,
    });
    return new Map(found.map((thing) => [thing.id, thing.revision.spec.name]));
  };
  const foodNames = await namesOf(
    'foods',
    specs.map((spec) => spec.food_id),
  );
  const packNames = await namesOf(
    'packs',
    specs.map((spec) => spec.pack_id),
  );
  const routeNames = await namesOf(
    'routes',
    specs.map((spec) => spec.route_id),
  );
  const laminateNames = await namesOf(
    'laminates',
    specs.flatMap((spec) => spec.laminate_ids),
  );
  const headlines = await findHeadlines(
    db,
    things.map((thing) => thing.id),
  );
  const outdated = await findOutdatedResults(
    db,
    [...headlines.values()].map((headline) => headline.result_id),
  );
  return things.map((thing) => {
    const { spec } = thing.revision;
    const headline = headlines.get(thing.id) ?? null;
    return {
      ...thing,
      food_name: foodNames.get(spec.food_id) ?? '',
      pack_name: packNames.get(spec.pack_id) ?? '',
      route_name: routeNames.get(spec.route_id) ?? '',
      laminate_names: spec.laminate_ids.map((id) => laminateNames.get(id) ?? ''),
      headline,
      is_outdated: headline !== null && outdated.has(headline.result_id),
    };
  });
}
