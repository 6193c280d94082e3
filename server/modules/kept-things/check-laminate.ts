import type { LaminateSpec } from '../../../shared/contract/laminates';
import type { FieldFault } from '../../../shared/errors/error-code';
import type { Queryable } from '../../db/client';
import { findArchivedIds, findRevisions } from '../../db/kept-thing-store';
import { materialRevisions, materials } from '../../db/schema';
import { inputInvalid } from '../../http/app-error';

/**
 * Every layer names a material of this account and a revision of that material. An archived material may stay where
 * it was, not come in anew.
 */
export async function checkLaminate(
  db: Queryable,
  { accountId, spec, base }: { accountId: string; spec: LaminateSpec; base?: LaminateSpec },
): Promise<void> {
  const ids = [...new Set(spec.layers.map((layer) => layer.material_revision_id))];
  const found = await findRevisions(
    db,
    { things: materials, revisions: materialRevisions },
    { accountId, ids },
  );
  const materialByRevision = new Map(found.map(({ thingId, revision }) => [revision.id, thingId]));
  const kept = new Set(base?.layers.map((layer) => layer.material_id));
  const chosenAnew = spec.layers.map((layer) => layer.material_id).filter((id) => !kept.has(id));
  const archived = await findArchivedIds(db, materials, [...new Set(chosenAnew)]);
  const faults = spec.layers.flatMap((layer, i): FieldFault[] => {
    const materialId = materialByRevision.get(layer.material_revision_id);
    if (materialId === layer.material_id) {
      if (!archived.has(materialId)) return [];
      return [
        {
          path: `spec.layers[${i}].material_id`,
          value: materialId,
          message: 'Material: this one is archived. Bring it back first, or choose another.',
        },
      ];
    }
    const field = materialId === undefined ? 'material_revision_id' : 'material_id';
    return [
      {
        path: `spec.layers[${i}].${field}`,
        value: layer[field],
        message: 'Material: choose one of this account.',
      },
    ];
  });
  if (faults.length > 0) throw inputInvalid(faults);
}
