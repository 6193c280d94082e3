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

/** A laminate at the revision that is computed. */
export interface LaminateAtRevision {
  id: string;
  revision: Revision<LaminateSpec>;
}

/** Everything a study uses, at its newest revisions; materials at the revisions that the laminates pin. */
export interface StudyInputs {
  food: KeptThing<FoodSpec>;
  pack: KeptThing<PackSpec>;
  route: KeptThing<RouteSpec>;
  /** In the order of the study. */
  laminates: KeptThing<LaminateSpec>[];
  /** What a tray is made of; null for other packs. */
  tray: LaminateAtRevision | null;
  materialRevisions: ReadonlyMap<string, Revision<MaterialSpec>>;
}

interface Loading {
  accountId: string;
  spec: StudySpec;
  /** What the study chose before: archived things may stay in it, not come in anew. */
  base?: StudySpec;
}

/** Throws input_invalid for the fields that name something the account does not have, or that is archived. */
export async function loadInputs(db: Queryable, { accountId, spec, base }: Loading): Promise<StudyInputs> {
  const food = await findThing(db, TABLES.foods, { accountId, id: spec.food_id });
  const pack = await findThing(db, TABLES.packs, { accountId, id: spec.pack_id });
  const route = await findThing(db, TABLES.routes, { accountId, id: spec.route_id });
  const found = await findThings(db, TABLES.laminates, { accountId, ids: spec.laminate_ids });
  const laminates = spec.laminate_ids.map((id) => found.find((laminate) => laminate.id === id));

  const keptIds = new Set(base && [base.food_id, base.pack_id, base.route_id, ...base.laminate_ids]);
  const choices: Choice[] = [
    { path: 'food_id', label: 'Food', id: spec.food_id, thing: food },
    { path: 'pack_id', label: 'Pack', id: spec.pack_id, thing: pack },
    { path: 'route_id', label: 'Route', id: spec.route_id, thing: route },
    ...laminates.map((thing, i) => ({
      path: `laminate_ids[${i}]`,
      label: 'Wall',
      id: spec.laminate_ids[i] ?? '',
      thing,
    })),
  ];
  const faults = choices.flatMap((choice) => faultOf(choice, keptIds) ?? []);
  if (!food || !pack || !route || faults.length > 0) throw inputInvalid(faults);

  const known = laminates.filter((laminate) => laminate !== undefined);
  const tray = await loadTray(db, accountId, pack.revision.spec);
  const layers = [...known, ...(tray ? [tray] : [])].flatMap(({ revision }) => revision.spec.layers);
  const ids = [...new Set(layers.map((layer) => layer.material_revision_id))];
  const materials = await findRevisions(db, TABLES.materials, { accountId, ids });
  return {
    food,
    pack,
    route,
    laminates: known,
    tray,
    materialRevisions: new Map(materials.map(({ revision }) => [revision.id, revision])),
  };
}

interface Choice {
  path: string;
  label: string;
  id: string;
  thing: KeptThing<unknown> | undefined;
}

function faultOf({ path, label, id, thing }: Choice, keptIds: ReadonlySet<string>): FieldFault | undefined {
  const fault = (message: string) => ({ path: `spec.${path}`, value: id, message });
  if (!thing) return fault(`${label}: choose one of this account.`);
  if (thing.archived_at === null || keptIds.has(id)) return undefined;
  return fault(`${label}: this one is archived. Bring it back first, or choose another.`);
}

async function loadTray(
  db: Queryable,
  accountId: string,
  { form }: PackSpec,
): Promise<LaminateAtRevision | null> {
  if (form.type !== 'tray') return null;
  const id = form.tray_laminate_id;
  const pinnedId = form.tray_laminate_revision_id;
  const laminate = await findThing(db, TABLES.laminates, { accountId, id });
  const [pinned] =
    pinnedId === undefined ? [] : await findRevisions(db, TABLES.laminates, { accountId, ids: [pinnedId] });
  const revision = pinnedId === undefined ? laminate?.revision : pinned?.revision;
  if (!revision) throw new Error(`The tray's wall ${id} is kept by its pack but missing.`);
  return { id, revision };
}
