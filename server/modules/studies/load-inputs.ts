import type { FoodSpec } from '../../../shared/contract/foods';
import type { KeptThing, Revision } from '../../../shared/contract/kept-things';
import type { LaminateSpec } from '../../../shared/contract/laminates';
import type { MaterialSpec } from '../../../shared/contract/materials';
import type { PackSpec } from '../../../shared/contract/packs';
import type { RouteSpec } from '../../../shared/contract/routes';
import type { StudySpec } from '../../../shared/contract/studies';
import type { FieldFault } from '../../../shared/errors/error-code';
import type { Queryable } from '../../db/client';
import { findRevisions, findThing, findThings } from '../../db/kept-thing-store';
import { inputInvalid } from '../../http/app-error';
import { TABLES } from './study-tables';

/** Everything a study uses, at its newest revisions; materials at the revisions that the laminates pin. */
export interface StudyInputs {
  food: KeptThing<FoodSpec>;
  pack: KeptThing<PackSpec>;
  route: KeptThing<RouteSpec>;
  /** In the order of the study. */
  laminates: KeptThing<LaminateSpec>[];
  materialRevisions: ReadonlyMap<string, Revision<MaterialSpec>>;
}

/** Throws input_invalid for the fields that name something the account does not have. */
export async function loadInputs(db: Queryable, accountId: string, spec: StudySpec): Promise<StudyInputs> {
  const food = await findThing(db, TABLES.foods, { accountId, id: spec.food_id });
  const pack = await findThing(db, TABLES.packs, { accountId, id: spec.pack_id });
  const route = await findThing(db, TABLES.routes, { accountId, id: spec.route_id });
  const found = await findThings(db, TABLES.laminates, { accountId, ids: spec.laminate_ids });
  const laminates = spec.laminate_ids.map((id) => found.find((laminate) => laminate.id === id));

  const faults: FieldFault[] = [];
  if (!food)
    faults.push({ path: 'spec.food_id', value: spec.food_id, message: 'Food: choose one of this account.' });
  if (!pack)
    faults.push({ path: 'spec.pack_id', value: spec.pack_id, message: 'Pack: choose one of this account.' });
  if (!route)
    faults.push({
      path: 'spec.route_id',
      value: spec.route_id,
      message: 'Route: choose one of this account.',
    });
  laminates.forEach((laminate, i) => {
    if (laminate) return;
    faults.push({
      path: `spec.laminate_ids[${i}]`,
      value: spec.laminate_ids[i],
      message: 'Wall: choose one of this account.',
    });
  });
  if (!food || !pack || !route || faults.length > 0) throw inputInvalid(faults);

  const known = laminates.filter((laminate) => laminate !== undefined);
  const ids = [
    ...new Set(
      known.flatMap(({ revision }) => revision.spec.layers.map((layer) => layer.material_revision_id)),
    ),
  ];
  const materials = await findRevisions(db, TABLES.materials, { accountId, ids });
  return {
    food,
    pack,
    route,
    laminates: known,
    materialRevisions: new Map(materials.map(({ revision }) => [revision.id, revision])),
  };
}
