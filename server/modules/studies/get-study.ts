import type { KeptThing } from '../../../shared/contract/kept-things';
import type { LaminateSpec } from '../../../shared/contract/laminates';
import type {
  NewerThing,
  Study,
  StudyHeadline,
  StudySpec,
  StudyWithResult,
} from '../../../shared/contract/studies';
import type { Queryable } from '../../db/client';
import { findNames, findThing, findThings } from '../../db/kept-thing-store';
import { notFound } from '../../http/app-error';
import { findHeadlines, findLatestResult, findNewerThings } from './results.repository';
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

/** What a card says: the names of what a study uses, its answer, and which newer data exist. */
export async function describeStudies(
  db: Queryable,
  accountId: string,
  things: readonly KeptThing<StudySpec>[],
): Promise<Study[]> {
  const specs = things.map((thing) => thing.revision.spec);
  const names = await findNames(db, accountId, [
    { things: TABLES.foods.things, ids: specs.map((spec) => spec.food_id) },
    { things: TABLES.packs.things, ids: specs.map((spec) => spec.pack_id) },
    { things: TABLES.routes.things, ids: specs.map((spec) => spec.route_id) },
    { things: TABLES.laminates.things, ids: specs.flatMap((spec) => spec.laminate_ids) },
  ]);
  const headlines = await findHeadlines(
    db,
    things.map((thing) => thing.id),
  );
  const newer = await findNewer(db, { accountId, things, headlines });
  return things.map((thing) => {
    const { spec } = thing.revision;
    const newerThings = newer.get(thing.id) ?? [];
    return {
      ...thing,
      food_name: names.get(spec.food_id) ?? '',
      pack_name: names.get(spec.pack_id) ?? '',
      route_name: names.get(spec.route_id) ?? '',
      laminate_names: spec.laminate_ids.map((id) => names.get(id) ?? ''),
      headline: headlines.get(thing.id) ?? null,
      is_outdated: newerThings.length > 0,
      newer: newerThings,
    };
  });
}

interface Finding {
  accountId: string;
  things: readonly KeptThing<StudySpec>[];
  headlines: ReadonlyMap<string, StudyHeadline>;
}

/** By study: what is newer than its latest result. Laminates are opened only where a material is. */
async function findNewer(
  db: Queryable,
  { accountId, things, headlines }: Finding,
): Promise<Map<string, NewerThing[]>> {
  const newerThan = await findNewerThings(
    db,
    [...headlines.values()].map((headline) => headline.result_id),
  );
  const newerOf = (thing: KeptThing<StudySpec>) =>
    newerThan.get(headlines.get(thing.id)?.result_id ?? '') ?? [];
  const withNewerMaterial = things.filter((thing) => newerOf(thing).some(({ kind }) => kind === 'material'));
  const ids = [...new Set(withNewerMaterial.flatMap((thing) => thing.revision.spec.laminate_ids))];
  const laminates = await findThings(db, TABLES.laminates, { accountId, ids });
  return new Map(
    things.map((thing) => {
      const { laminate_ids } = thing.revision.spec;
      const own = laminates.filter(({ id }) => laminate_ids.includes(id));
      const newer = newerOf(thing).map(({ revisionId, ...one }) => ({
        ...one,
        laminates: one.kind === 'material' ? holdingOlder(own, { id: one.id, revisionId }) : [],
      }));
      return [thing.id, newer];
    }),
  );
}

/** Laminates that still hold another revision of the material than its newest. */
function holdingOlder(
  laminates: readonly KeptThing<LaminateSpec>[],
  material: { id: string; revisionId: string },
): NewerThing['laminates'] {
  return laminates
    .filter(({ revision }) =>
      revision.spec.layers.some(
        (layer) => layer.material_id === material.id && layer.material_revision_id !== material.revisionId,
      ),
    )
    .map(({ id, revision }) => ({ id, name: revision.spec.name }));
}
